package lodebook.assembly.safety;

/// Static flux densities at which people or things need care.
public enum FieldLimit {
  /// People with active implants keep out above it.
  ///
  /// Source: Directive 2013/35/EU, action level for static fields. ICNIRP 2009 says that such
  /// devices are in general not affected below 0.5 mT.
  IMPLANTS(0.5e-3),
  /// Loose iron may fly above it, in the fringe of sources over 100 mT.
  ///
  /// Source: Directive 2013/35/EU, action level (the exact scope from memory).
  LOOSE_IRON(3e-3);

  private final double tesla;

  FieldLimit(double tesla) {
    this.tesla = tesla;
  }

  /// The limit, tesla.
  public double tesla() {
    return tesla;
  }
}
