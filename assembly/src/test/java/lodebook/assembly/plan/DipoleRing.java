package lodebook.assembly.plan;

import java.util.Arrays;
import lodebook.assembly.layout.Layout;

/// A ring of small cubes of dipoles: a field computed the plain way, to judge plans by.
///
/// Each magnet is 3 × 3 × 5 dipoles of equal moment in a body that stays square to the ring.
final class DipoleRing {
  private final Layout layout;
  private final double sizeMetres;
  private final double lengthMetres;
  private final int points;

  DipoleRing(Layout layout, double sizeMetres, double lengthMetres) {
    this.layout = layout;
    this.sizeMetres = sizeMetres;
    this.lengthMetres = lengthMetres;
    points = 12 * layout.slots();
  }

  /// Radial field at equal angles on the working circle.
  double[] radialField(double[] remanence, double[] facingDegrees) {
    double[] field = new double[points];
    for (int i = 0; i < remanence.length; i++) {
      add(field, i, remanence[i], facingDegrees[i]);
    }
    return field;
  }

  /// Facings by the layout's rule, slot 1 first.
  double[] ruleFacings() {
    double[] facings = new double[layout.slots()];
    Arrays.setAll(facings, i -> layout.ruleFacing(i + 1).degrees());
    return facings;
  }

  /// What each slot gives to the harmonics, for a planner.
  SlotHarmonics harmonics(double[] facingDegrees) {
    int highest = points / 3;
    double[][] re = new double[highest + 1][layout.slots()];
    double[][] im = new double[highest + 1][layout.slots()];
    for (int i = 0; i < layout.slots(); i++) {
      double[] field = new double[points];
      add(field, i, 1, facingDegrees[i]);
      for (int h = 0; h <= highest; h++) {
        double[] c = harmonic(field, h);
        re[h][i] = c[0];
        im[h][i] = c[1];
      }
    }
    return new SlotHarmonics(layout.polePairs(), layout.segmentsPerPolePair(), re, im);
  }

  /// Unwanted harmonics over the working wave, from the fields alone: the placed ring's less the
  /// ideal ring's, orders |p(1 + k·m)| left out one by one.
  double unwanted(double[] remanence, double[] facingDegrees, double[] idealRemanence) {
    double[] placed = radialField(remanence, facingDegrees);
    double[] ideal = radialField(idealRemanence, ruleFacings());
    double sum = 0;
    for (int h = 0; h <= points / 3; h++) {
      boolean wanted = false;
      for (int m = -points; m <= points; m++) {
        wanted |= h == Math.abs(layout.polePairs() * (1 + layout.segmentsPerPolePair() * m));
      }
      if (!wanted) {
        double[] a = harmonic(placed, h);
        double[] b = harmonic(ideal, h);
        double square = Math.pow(a[0] - b[0], 2) + Math.pow(a[1] - b[1], 2);
        sum += h == 0 ? square : 2 * square;
      }
    }
    double amplitude = workingAmplitude(placed);
    return Math.sqrt(sum / (amplitude * amplitude / 2));
  }

  double workingAmplitude(double[] field) {
    double[] c = harmonic(field, layout.polePairs());
    return 2 * Math.hypot(c[0], c[1]);
  }

  private double[] harmonic(double[] field, int order) {
    double re = 0;
    double im = 0;
    for (int t = 0; t < points; t++) {
      double angle = 2 * Math.PI * ((long) t * order % points) / points;
      re += field[t] * Math.cos(angle);
      im -= field[t] * Math.sin(angle);
    }
    return new double[] {re / points, im / points};
  }

  private void add(double[] field, int i, double remanence, double facingDegrees) {
    double angle = 2 * Math.PI * i / layout.slots();
    double north = angle + Math.toRadians(facingDegrees);
    double mx = Math.cos(north);
    double my = Math.sin(north);
    double moment = remanence * sizeMetres * sizeMetres * lengthMetres / 45 / (4 * Math.PI);
    for (int a = 0; a < 45; a++) {
      double radial = layout.slotRadiusMetres() + (a % 3 - 1) * sizeMetres / 3;
      double across = (a / 3 % 3 - 1) * sizeMetres / 3;
      double z = (a / 9 - 2) * lengthMetres / 5;
      double x = radial * Math.cos(angle) - across * Math.sin(angle);
      double y = radial * Math.sin(angle) + across * Math.cos(angle);
      for (int t = 0; t < points; t++) {
        double at = 2 * Math.PI * t / points;
        double dx = layout.workingRadiusMetres() * Math.cos(at) - x;
        double dy = layout.workingRadiusMetres() * Math.sin(at) - y;
        double square = dx * dx + dy * dy + z * z;
        double along = mx * dx + my * dy;
        double factor = moment / (square * Math.sqrt(square));
        double bx = factor * (3 * along * dx / square - mx);
        double by = factor * (3 * along * dy / square - my);
        field[t] += bx * Math.cos(at) + by * Math.sin(at);
      }
    }
  }
}
