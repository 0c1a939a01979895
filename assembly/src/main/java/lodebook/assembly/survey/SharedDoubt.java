package lodebook.assembly.survey;

/// The part of a magnet's strength uncertainty that it shares with others: the doubt about an
/// unmeasured lot's mean, or about the meter with which a lot was measured.
///
/// @param name magnets with the same name share the error
/// @param standardUncertaintyTesla one standard deviation of the shared error, tesla; it comes on
///   top of the magnet's own
public record SharedDoubt(String name, double standardUncertaintyTesla) {}
