package lodebook.reports.sheet;

/// Sizes of paper.
public enum PaperSize {
  /// ISO 216: 210 × 297 mm.
  A4(210, 297),
  /// ANSI/ASME Y14.1 A: 8.5 × 11 in.
  LETTER(215.9, 279.4);

  private final double width;
  private final double height;

  PaperSize(double width, double height) {
    this.width = width;
    this.height = height;
  }

  /// Width, millimetres.
  public double widthMillimetres() {
    return width;
  }

  /// Height, millimetres.
  public double heightMillimetres() {
    return height;
  }
}
