package lodebook.db.layouts;

import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Spot;

/// The words of probe points as files and tables have them.
public final class LayoutWords {
  private LayoutWords() {}

  /// `centre` or `to-next`.
  public static String word(Spot spot) {
    return switch (spot) {
      case CENTRE -> "centre";
      case TO_NEXT -> "to-next";
    };
  }

  /// `radial` or `tangential`.
  public static String word(Component component) {
    return switch (component) {
      case RADIAL -> "radial";
      case TANGENTIAL -> "tangential";
    };
  }

  /// The spot of a word.
  public static Spot spot(String word) {
    return switch (word) {
      case "centre" -> Spot.CENTRE;
      case "to-next" -> Spot.TO_NEXT;
      default -> throw new IllegalArgumentException(word);
    };
  }

  /// The component of a word.
  public static Component component(String word) {
    return switch (word) {
      case "radial" -> Component.RADIAL;
      case "tangential" -> Component.TANGENTIAL;
      default -> throw new IllegalArgumentException(word);
    };
  }
}
