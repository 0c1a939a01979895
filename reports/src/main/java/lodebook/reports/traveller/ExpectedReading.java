package lodebook.reports.traveller;

import lodebook.assembly.layout.ProbePoint;

/// A reading that a person will take, and what it should be.
///
/// @param point where and which component
/// @param valueTesla expected value
/// @param bandTesla half width of the band in which it should lie
public record ExpectedReading(ProbePoint point, double valueTesla, double bandTesla) {}
