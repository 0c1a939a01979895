package lodebook.assembly.layout;

/// One place and direction at which a ring is read.
///
/// @param slot slot number, from 1
/// @param spot over the slot or midway to the next
/// @param component radial or tangential
public record ProbePoint(int slot, Spot spot, Component component) {}
