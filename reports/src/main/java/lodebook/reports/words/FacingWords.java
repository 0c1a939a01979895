package lodebook.reports.words;

import java.util.Locale;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Layout;

/// Says a facing as people at the bench hear it: by the neighbouring slot and never by a turning
/// sense, so that it holds on both faces.
public final class FacingWords {
  private static final double EXACT_DEGREES = 0.5;

  private final Words words;

  /// Words in a language.
  public FacingWords(Locale language) {
    this.words = new Words(language);
  }

  /// Where the north of a slot's magnet points: "north OUT", "north to slot 8", "north OUT, leaning
  /// to slot 8", "north 30° from OUT to slot 8".
  public String of(Layout layout, int slot, Facing facing) {
    int quarter = (int) Math.round(facing.degrees() / 90) % 4;
    if (near(facing, quarter * 90.0)) {
      return words.say("facing.north", goal(layout, slot, quarter));
    }
    boolean next = facing.degrees() < 180;
    Object neighbour = Integer.toString(next ? layout.next(slot) : layout.previous(slot));
    boolean out = facing.degrees() < 90 || facing.degrees() > 270;
    String radial = words.say(out ? "facing.out" : "facing.in");
    if (near(facing, 45) || near(facing, 135) || near(facing, 225) || near(facing, 315)) {
      return words.say("facing.leaning", radial, neighbour);
    }
    double lean = Math.abs(facing.degreesFrom(out ? Facing.OUT : Facing.IN));
    String from = words.say(out ? "facing.from.out" : "facing.from.in");
    return words.say("facing.between", degrees(lean), from, neighbour);
  }

  private String goal(Layout layout, int slot, int quarter) {
    return switch (quarter) {
      case 0 -> words.say("facing.out");
      case 1 -> words.say("facing.slot", Integer.toString(layout.next(slot)));
      case 2 -> words.say("facing.in");
      default -> words.say("facing.slot", Integer.toString(layout.previous(slot)));
    };
  }

  private static boolean near(Facing facing, double degrees) {
    return Math.abs(facing.degreesFrom(new Facing(degrees))) < EXACT_DEGREES;
  }

  private String degrees(double angle) {
    boolean whole = Math.abs(angle - Math.rint(angle)) < 0.05;
    return words.number(angle, whole ? 0 : 1);
  }
}
