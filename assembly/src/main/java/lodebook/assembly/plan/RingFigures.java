package lodebook.assembly.plan;

/// What a ring comes to.
///
/// @param unwantedHarmonics root mean square of the harmonics no ideal ring has over that of the
///   working wave
/// @param workingAmplitudeTesla amplitude of the working wave
public record RingFigures(double unwantedHarmonics, double workingAmplitudeTesla) {
  static RingFigures of(RotorPlan plan) {
    return new RingFigures(plan.unwantedHarmonics(), plan.workingAmplitudeTesla());
  }
}
