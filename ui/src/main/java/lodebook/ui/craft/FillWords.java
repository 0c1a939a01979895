package lodebook.ui.cli;

import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.plan.FillingOrder;
import lodebook.assembly.plan.FillingStep;
import lodebook.assembly.plan.OrderPattern;
import lodebook.assembly.plan.SlotForce;
import lodebook.assembly.plan.Wall;
import lodebook.ui.craft.StepWords;
import lodebook.ui.words.Amounts;
import lodebook.ui.words.Words;
import org.jspecify.annotations.Nullable;

/// What a builder is told about a magnet going in: on which wall it presses, whether it is pushed
/// out and where to hold it then, which neighbour must be held as well.
final class FillWords implements StepWords {
  private final Words words;

  FillWords(Words words) {
    this.words = words;
  }

  @Override
  public String of(Layout layout, FillingStep step) {
    StringBuilder text = new StringBuilder(itself(layout, step));
    for (SlotForce neighbour : step.neighbours()) {
      if (neighbour.pushOutNewtons() > FillingOrder.NOT_WORTH_A_WORD) {
        text.append(
            words.say("fill.neighbour", neighbour.slot(), newtons(neighbour.pushOutNewtons())));
      }
    }
    return text.toString();
  }

  private String itself(Layout layout, FillingStep step) {
    Wall wall = step.wall();
    String hold = words.say("fill.hold." + layout.insertFrom().name().toLowerCase(Locale.ROOT));
    String lift = newtons(Math.max(0, step.force().pushOutNewtons()));
    return switch (step.behaviour()) {
      case HOLDS -> words.say("fill.holds");
      case PRESSES -> words.say("fill.presses", wall(wall), press(step));
      case LIFTS ->
          wall == null
              ? words.say("fill.lifts", lift, hold)
              : words.say("fill.presses-lifts", wall(wall), press(step), lift, hold);
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
    return newtons(Math.abs(force));
  }

  private static String newtons(double force) {
    return Amounts.fixed(force, 1);
  }

  /// How the order of filling goes, such as every second slot first.
  ///
  /// @param filled slots in the order in which they are filled
  String pattern(List<Integer> filled, int slots) {
    OrderPattern pattern = OrderPattern.of(filled, slots);
    return pattern == null
        ? words.say("fill.by-table")
        : words.say("fill.pattern." + pattern.name().toLowerCase(Locale.ROOT).replace('_', '-'));
  }
}
