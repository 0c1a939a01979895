package lodebook.assembly.magnet;

/// How strong a magnet is believed to be.
///
/// @param remanenceTesla best estimate of the remanence at 20 °C, tesla
/// @param standardUncertaintyTesla standard uncertainty of that estimate (one standard deviation),
///   tesla
public record Strength(double remanenceTesla, double standardUncertaintyTesla) {}
