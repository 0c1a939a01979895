package lodebook.reports.canvas;

/// A picture laid out for a width, ready to be drawn anywhere.
public interface Drawing {
  /// Its height, millimetres.
  double height();

  /// Draws it below and to the right of the canvas's origin.
  void draw(Canvas canvas);
}
