package lodebook.assembly.magnet;

/// The shapes a magnet type can have.
public enum Shape {
  /// Thickness along the magnetisation, width across it, length along the rotor's axis.
  BLOCK,
  /// A round plate magnetised along its thickness.
  DISC,
  /// A round bar along the rotor's axis, magnetised across its diameter.
  ROD,
  /// A ring segment with inner and outer diameter, an arc and a length along the rotor's axis.
  ARC
}
