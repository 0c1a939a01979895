package lodebook.ui.desk.ring;

import java.util.HashMap;
import java.util.Map;
import javafx.scene.paint.Color;
import lodebook.reports.canvas.Palette;
import lodebook.ui.desk.look.Look;

/// The paper's colours as a theme of the screen has them.
final class RingColours {
  private final Map<java.awt.Color, Color> colours = new HashMap<>();

  RingColours(Look look) {
    colours.put(Palette.PAPER, look.color("-paper"));
    colours.put(Palette.GRAPHITE, look.color("-graphite"));
    colours.put(Palette.PENCIL, look.color("-pencil"));
    colours.put(Palette.RULE, look.color("-rule"));
    colours.put(Palette.SHADE, look.color("-shade"));
    colours.put(Palette.NORTH, look.color("-north"));
    colours.put(Palette.SOUTH, look.color("-south"));
  }

  /// The screen's colour for one of the paper's; a colour that the palette does not name stays.
  Color of(java.awt.Color paper) {
    Color color = colours.get(paper);
    return color == null
        ? Color.rgb(paper.getRed(), paper.getGreen(), paper.getBlue(), paper.getAlpha() / 255.0)
        : color;
  }
}
