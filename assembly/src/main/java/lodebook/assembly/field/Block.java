package lodebook.assembly.field;

/// A rectangular block.
///
/// Closed form from the surface charges of the faces (Akoun and Yonnet 1984, IEEE Trans. Magn. 20,
/// 1962, give the same sums over the eight corners). The eight arctangents of a diagonal element
/// are summed as the argument of one complex product, the eight logarithms of another as one
/// logarithm of a quotient.
///
/// At an edge the field is unbounded: a point closer than 1 nm to one is taken at 1 nm. Farther
/// away than 30 bounding radii the sums would lose digits; there the block is 27 dipoles at Gauss
/// points, right to 10⁻¹⁰ of the value.
///
/// @param xMetres size along x, the thickness
/// @param yMetres size along y, the width
/// @param zMetres size along z, the length
public record Block(double xMetres, double yMetres, double zMetres) implements Body {

  /// Refuses a size that is not a positive number.
  public Block {
    if (!(xMetres > 0 && yMetres > 0 && zMetres > 0)) {
      throw new IllegalArgumentException(
          "a block has three sizes above 0 m, not " + xMetres + ", " + yMetres + ", " + zMetres);
    }
  }

  @Override
  public void planarTensor(double x, double y, double z, double[] into, int at) {
    double a = xMetres / 2;
    double b = yMetres / 2;
    double c = zMetres / 2;
    if (FarField.applies(x, y, z, a * a + b * b + c * c)) {
      FarField.planarOfBlock(a, b, c, x, y, z, into, at);
    } else {
      BlockTensor.planar(a, b, c, x, y, z, into, at);
    }
  }

  @Override
  public void fullTensor(double x, double y, double z, double[] into) {
    double a = xMetres / 2;
    double b = yMetres / 2;
    double c = zMetres / 2;
    double[] f = new double[3];
    if (FarField.applies(x, y, z, a * a + b * b + c * c)) {
      FarField.planarOfBlock(b, c, a, y, z, x, f, 0);
      into[2] = f[1];
      into[5] = f[2];
      FarField.planarOfBlock(a, c, b, x, z, y, f, 0);
      into[4] = f[2];
      FarField.planarOfBlock(a, b, c, x, y, z, f, 0);
    } else {
      BlockTensor.planar(b, c, a, y, z, x, f, 0);
      into[2] = f[1];
      into[5] = f[2];
      BlockTensor.planar(a, c, b, x, z, y, f, 0);
      into[4] = f[2];
      BlockTensor.planar(a, b, c, x, y, z, f, 0);
    }
    into[0] = f[0];
    into[1] = f[1];
    into[3] = f[2];
  }

  @Override
  public boolean contains(double x, double y, double z) {
    return BlockTensor.beyond(x, xMetres / 2) > 0
        && BlockTensor.beyond(y, yMetres / 2) > 0
        && BlockTensor.beyond(z, zMetres / 2) > 0;
  }

  @Override
  public double volume() {
    return xMetres * yMetres * zMetres;
  }

  @Override
  public double boundingRadius() {
    return Math.sqrt(xMetres * xMetres + yMetres * yMetres + zMetres * zMetres) / 2;
  }
}
