package lodebook.ui.desk.look;

import java.util.Locale;

/// The faces of the one theme.
public enum Theme {
  /// Graphite on paper.
  LIGHT,
  /// Chalk on slate.
  DARK,
  /// Black on white, strong lines.
  CONTRAST;

  /// Its class in the style sheet.
  public String styleClass() {
    return name().toLowerCase(Locale.ROOT);
  }
}
