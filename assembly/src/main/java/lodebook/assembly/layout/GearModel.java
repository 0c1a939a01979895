package lodebook.assembly.layout;

import org.jspecify.annotations.Nullable;

/// The design of a gear, one revision of it: two rings and the iron pieces between them.
///
/// @param code the shop's number for the model
/// @param revision letter or number of the revision
/// @param inner the inner ring's layout
/// @param outer the outer ring's layout
/// @param modulatorPieces number of iron pieces n
/// @param held the member that stands still
/// @param modulatorInnerRadiusMetres inner radius of the iron pieces, or null where not stated
/// @param modulatorOuterRadiusMetres their outer radius, or null where not stated
/// @param stackMetres length of the active parts along the axis
/// @param requiredPullOutNewtonMetres torque it must carry without slipping, or null where not
///   stated
public record GearModel(
    String code,
    String revision,
    RingDesign inner,
    RingDesign outer,
    int modulatorPieces,
    Member held,
    @Nullable Double modulatorInnerRadiusMetres,
    @Nullable Double modulatorOuterRadiusMetres,
    double stackMetres,
    @Nullable Double requiredPullOutNewtonMetres) {

  /// The model's name as people read it.
  public String spoken() {
    return code + " rev " + revision;
  }

  /// Turns of the faster free member for one turn of the slower, with its sign: negative where they
  /// turn against each other.
  ///
  /// Source: Atallah and Howe 2001, IEEE Trans. Magn. 37, 2844: n = p_i + p_o and p_i·ω_i + p_o·ω_o
  /// = n·ω_m.
  public double ratio() {
    double pi = inner.layout().polePairs();
    double po = outer.layout().polePairs();
    double n = modulatorPieces;
    return switch (held) {
      case OUTER -> n / pi;
      case MODULATOR -> -po / pi;
      case INNER -> n / po;
    };
  }

  /// How roughly the ring with so many pole pairs runs over n pieces: 2pn / lcm(2p, n), which is
  /// the greatest common divisor of 2p and n; 1 is smoothest.
  ///
  /// Source: Zhu and Howe 2000, IEEE Trans. Energy Convers. 15, 407 (from memory).
  public static int coggingFactor(int polePairs, int pieces) {
    int a = 2 * polePairs;
    int b = pieces;
    while (b != 0) {
      int rest = a % b;
      a = b;
      b = rest;
    }
    return a;
  }

  /// Cogging factor of the inner ring.
  public int innerCoggingFactor() {
    return coggingFactor(inner.layout().polePairs(), modulatorPieces);
  }

  /// Cogging factor of the outer ring.
  public int outerCoggingFactor() {
    return coggingFactor(outer.layout().polePairs(), modulatorPieces);
  }
}
