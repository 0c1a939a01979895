package lodebook.assembly.survey;

import java.util.List;
import lodebook.assembly.layout.ProbePoint;

/// A place at which two surveys of the same ring differ by more than their uncertainty.
///
/// What both share, the magnets as they stand, does not count in it; what each has alone does: the
/// probe's place and tilt, the meter's gain and floor.
///
/// @param point where both read
/// @param surveys the names of the two
/// @param readTesla what each read, freed of slips of the person measuring, tesla
/// @param bandTesla two standard deviations of the difference, tesla
public record Disagreement(
    ProbePoint point, List<String> surveys, List<Double> readTesla, double bandTesla) {
  public Disagreement {
    surveys = List.copyOf(surveys);
    readTesla = List.copyOf(readTesla);
  }

  /// The first less the second, tesla.
  public double differenceTesla() {
    return readTesla.getFirst() - readTesla.getLast();
  }
}
