package lodebook.reports.canvas;

import java.awt.Color;

/// The few colours of paper and pictures, named by what they are for.
///
/// The two pole tints also differ in grey (the north tint is darker), and a pole always carries its
/// letter.
public final class Palette {
  /// The ground.
  public static final Color PAPER = new Color(0xFFFFFF);

  /// Lines and letters.
  public static final Color GRAPHITE = new Color(0x26292C);

  /// Secondary lines and letters.
  public static final Color PENCIL = new Color(0x666C70);

  /// Rules and grids.
  public static final Color RULE = new Color(0xA9AEB1);

  /// Shading of the working side and of table heads.
  public static final Color SHADE = new Color(0xECEAE4);

  /// The half of a magnet that holds its north.
  public static final Color NORTH = new Color(0xDD9467);

  /// The half of a magnet that holds its south.
  public static final Color SOUTH = new Color(0xDDE9EE);

  private Palette() {}
}
