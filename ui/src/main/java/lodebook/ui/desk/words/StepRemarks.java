package lodebook.ui.desk.words;

import java.util.Locale;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.plan.FillingStep;
import lodebook.assembly.plan.Wall;
import lodebook.ui.craft.StepWords;
import org.jspecify.annotations.Nullable;

/// What a builder is told about a magnet going in, for plans that are made at the desk.
public final class StepRemarks implements StepWords {
  private final DeskWords words;

  /// Remarks in a language.
  public StepRemarks(DeskWords words) {
    this.words = words;
  }

  @Override
  public String of(Layout layout, FillingStep step) {
    Wall wall = step.wall();
    String lift = words.number(Math.max(0, step.force().pushOutNewtons()), 1);
    return switch (step.behaviour()) {
      case HOLDS -> words.say("fill.holds");
      case PRESSES -> words.say("fill.presses", wall(wall), press(step));
      case LIFTS ->
          wall == null
              ? words.say("fill.lifts", lift)
              : words.say("fill.presses-lifts", wall(wall), press(step), lift);
    };
  }

  private String wall(@Nullable Wall wall) {
    return wall == null ? "" : words.say("wall." + wall.name().toLowerCase(Locale.ROOT));
  }

  private String press(FillingStep step) {
    boolean radial = step.wall() == Wall.OUTER || step.wall() == Wall.INNER;
    double force = radial ? step.force().radialNewtons() : step.force().tangentialNewtons();
    return words.number(Math.abs(force), 1);
  }
}
