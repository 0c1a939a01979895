package lodebook.ui.craft;

import java.util.Locale;
import java.util.function.DoubleFunction;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.plan.FillingOrder;
import lodebook.assembly.plan.FillingStep;
import lodebook.assembly.plan.SlotForce;
import lodebook.assembly.plan.Wall;
import org.jspecify.annotations.Nullable;

/// What a builder is told about a magnet going in: on which wall it presses, whether it is pushed
/// out and where to hold it then, which neighbour must be held as well. Both faces say it alike,
/// each from its own bundle.
public final class FillWords implements StepWords {
  private final Sayings words;
  private final DoubleFunction<String> newtons;

  /// The sentences of a face.
  @FunctionalInterface
  public interface Sayings {
    /// The sentence of a key, with its places filled.
    String say(String key, Object... arguments);
  }

  /// @param words the sentences
  /// @param newtons how a force is written
  public FillWords(Sayings words, DoubleFunction<String> newtons) {
    this.words = words;
    this.newtons = newtons;
  }

  @Override
  public String of(Layout layout, FillingStep step) {
    StringBuilder text = new StringBuilder(itself(layout, step));
    for (SlotForce neighbour : step.neighbours()) {
      if (neighbour.pushOutNewtons() > FillingOrder.NOT_WORTH_A_WORD) {
        text.append(
            words.say(
                "fill.neighbour", neighbour.slot(), newtons.apply(neighbour.pushOutNewtons())));
      }
    }
    return text.toString();
  }

  private String itself(Layout layout, FillingStep step) {
    Wall wall = step.wall();
    String hold = words.say("fill.hold." + layout.insertFrom().name().toLowerCase(Locale.ROOT));
    String lift = newtons.apply(Math.max(0, step.force().pushOutNewtons()));
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

  private String press(FillingStep step) {
    Wall wall = step.wall();
    double force =
        wall == Wall.OUTER || wall == Wall.INNER
            ? step.force().radialNewtons()
            : step.force().tangentialNewtons();
    return newtons.apply(Math.abs(force));
  }
}
