package lodebook.ui.desk.look;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javafx.scene.Parent;
import javafx.scene.paint.Color;
import javafx.scene.text.Font;
import lodebook.reports.canvas.Typeface;

/// The theme as the style sheet `desk.css` has it: one place for colours, named by what they are
/// for.
public final class Look {
  private static final String SHEET = "desk.css";
  private static final Pattern ROLE = Pattern.compile("(-[a-z-]+)\\s*:\\s*(#[0-9a-fA-F]{6})\\s*;");

  private final Theme theme;
  private final Map<String, Color> roles;

  /// The roles of a theme, read from the style sheet.
  public Look(Theme theme) {
    this.theme = theme;
    this.roles = roles(sheet(), theme);
  }

  /// Which face it is.
  public Theme theme() {
    return theme;
  }

  /// The colour of a role, such as `-graphite`.
  public Color color(String role) {
    Color color = roles.get(role);
    if (color == null) {
      throw new IllegalArgumentException("the style sheet has no role " + role + " in " + theme);
    }
    return color;
  }

  /// Dresses a window's root.
  public void dress(Parent root) {
    typeface();
    String sheet = url();
    if (!root.getStylesheets().contains(sheet)) {
      root.getStylesheets().add(sheet);
    }
    for (Theme other : Theme.values()) {
      root.getStyleClass().remove(other.styleClass());
    }
    if (!root.getStyleClass().contains("desk")) {
      root.getStyleClass().add("desk");
    }
    root.getStyleClass().add(theme.styleClass());
  }

  /// The screen uses the typeface of the papers, so it looks the same on every computer.
  private static void typeface() {
    for (String cut : new String[] {"DejaVuSansCondensed.ttf", "DejaVuSansCondensed-Bold.ttf"}) {
      try (InputStream file = Typeface.class.getResourceAsStream(cut)) {
        Font.loadFont(file, 12);
      } catch (IOException unreadable) {
        throw new UncheckedIOException(unreadable);
      }
    }
  }

  private static String url() {
    return String.valueOf(Look.class.getResource(SHEET));
  }

  static String sheet() {
    try (InputStream file = Look.class.getResourceAsStream(SHEET)) {
      if (file == null) {
        throw new IllegalStateException("the program was built without its style sheet");
      }
      return new String(file.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  /// The roles that a theme's block of a style sheet names.
  static Map<String, Color> roles(String sheet, Theme theme) {
    int start = sheet.indexOf("." + theme.styleClass() + " {");
    if (start < 0) {
      throw new IllegalStateException("the style sheet has no theme " + theme);
    }
    Matcher each = ROLE.matcher(sheet.substring(start, sheet.indexOf('}', start)));
    Map<String, Color> roles = new HashMap<>();
    while (each.find()) {
      roles.put(each.group(1), Color.web(each.group(2)));
    }
    return Map.copyOf(roles);
  }
}
