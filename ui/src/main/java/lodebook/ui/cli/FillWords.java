package lodebook.ui.cli;

import java.util.Locale;
import lodebook.assembly.plan.FillingStep;
import lodebook.assembly.plan.Wall;
import lodebook.ui.words.Amounts;
import lodebook.ui.words.Words;
import org.jspecify.annotations.Nullable;

/// What a builder is told about a magnet going in: on which wall it presses, whether it lifts.
final class FillWords {
  private final Words words;

  FillWords(Words words) {
    this.words = words;
  }

  /// The words for one step.
  String of(FillingStep step) {
    Wall wall = step.wall();
    String lift = Amounts.fixed(Math.max(0, step.force().pushOutNewtons()), 1);
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

  private static String press(FillingStep step) {
    Wall wall = step.wall();
    double force =
        wall == Wall.OUTER || wall == Wall.INNER
            ? step.force().radialNewtons()
            : step.force().tangentialNewtons();
    return Amounts.fixed(Math.abs(force), 1);
  }
}
