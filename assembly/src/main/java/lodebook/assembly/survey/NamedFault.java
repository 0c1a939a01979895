package lodebook.assembly.survey;

/// A fault by slot and kind alone.
///
/// @param slot slot number
/// @param kind what is wrong
public record NamedFault(int slot, FaultKind kind) {}
