package lodebook.assembly.plan;

/// How much the pull-out torques of gears differ because their magnets do.
///
/// Model: the torque comes of the inner ring's working wave meeting the outer ring's through the
/// modulator, so it is proportional to the product of the two amplitudes. It says nothing of the
/// torque itself, and leaves out saturation of the iron, differences in gaps, lengths and
/// modulators, and temperature.
public final class PullOutSpread {
  private PullOutSpread() {}

  /// Standard deviation of the gears' pull-out torques over their mean.
  ///
  /// @param innerTesla working amplitude of each gear's inner ring
  /// @param outerTesla working amplitude of each gear's outer ring, in the same order
  public static double relative(double[] innerTesla, double[] outerTesla) {
    if (innerTesla.length != outerTesla.length || innerTesla.length < 2) {
      throw new IllegalArgumentException(
          "a spread needs two gears or more with two rings each, not "
              + innerTesla.length
              + " inner and "
              + outerTesla.length
              + " outer rings");
    }
    int gears = innerTesla.length;
    double mean = 0;
    for (int i = 0; i < gears; i++) {
      mean += innerTesla[i] * outerTesla[i] / gears;
    }
    double squares = 0;
    for (int i = 0; i < gears; i++) {
      double off = innerTesla[i] * outerTesla[i] / mean - 1;
      squares += off * off;
    }
    return Math.sqrt(squares / (gears - 1));
  }
}
