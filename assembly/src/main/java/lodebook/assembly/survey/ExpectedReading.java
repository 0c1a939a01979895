package lodebook.assembly.survey;

import lodebook.assembly.layout.ProbePoint;

/// What a right ring reads at one probe point.
///
/// @param point where
/// @param valueTesla expected value, tesla
/// @param bandTesla two standard deviations of a single reading: about 95 % of right readings lie
///   within ± this
public record ExpectedReading(ProbePoint point, double valueTesla, double bandTesla) {}
