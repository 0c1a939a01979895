package lodebook.assembly.survey;

import lodebook.assembly.layout.ProbePoint;

/// One reading beside what it should be in a right ring.
///
/// @param point where the reading was really taken, as far as the measuring tells
/// @param expectedTesla value in a right ring, tesla
/// @param bandTesla two standard deviations of that value, tesla
/// @param readTesla the value read, freed of slips of the person measuring, tesla
public record Evidence(
    ProbePoint point, double expectedTesla, double bandTesla, double readTesla) {}
