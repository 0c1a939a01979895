package lodebook.assembly.magnet;

/// The remanence of a piece as its readings show it.
///
/// @param strength remanence at 20 °C with its whole standard uncertainty
/// @param sharedTesla the part of the standard uncertainty that comes from the meters' gain and is
///   the same, in proportion, for every piece read with them, tesla
/// @param ownTesla the part that is this piece's alone (floor, standoff, temperature, dimensions),
///   tesla; the squares of the two parts sum to the square of the whole
public record RemanenceEstimate(Strength strength, double sharedTesla, double ownTesla) {}
