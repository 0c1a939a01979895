package lodebook.reports.canvas;

/// Which end of a text stands at the given point.
public enum Anchor {
  /// The text begins at the point.
  START(0),
  /// The point is in the middle of the text's width.
  MIDDLE(0.5),
  /// The text ends at the point.
  END(1);

  private final double share;

  Anchor(double share) {
    this.share = share;
  }

  /// Share of the text's width that lies before the point.
  double share() {
    return share;
  }
}
