package lodebook.ui.craft;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import lodebook.assembly.plan.MixPolicy;
import org.jspecify.annotations.Nullable;

/// What is to be planned, and how.
///
/// @param rotors the rotors
/// @param lots lots to take from
/// @param mix which lots may go together
/// @param apart of each group a rotor takes one lot at most
/// @param keptFor pieces that are kept for a rotor, with its number: where it is planned it must
///   have them, and no other rotor gets them
/// @param without pieces that are not used
/// @param seed the same seed gives the same plan from the same stock
/// @param seconds how long to search at most, or null for the usual effort
public record PlanWish(
    List<String> rotors,
    List<String> lots,
    MixPolicy mix,
    List<Set<String>> apart,
    Map<String, String> keptFor,
    Set<String> without,
    long seed,
    @Nullable Double seconds) {
  private static final int LONGEST_SETTINGS = 1000;

  public PlanWish {
    rotors = List.copyOf(rotors);
    lots = List.copyOf(lots);
    apart = apart.stream().<Set<String>>map(TreeSet::new).toList();
    keptFor = Map.copyOf(keptFor);
    without = Set.copyOf(without);
  }

  /// The wish as it is kept with the plan.
  String settings() {
    StringBuilder text = new StringBuilder("--from " + String.join(",", lots));
    text.append(" --mix ").append(mix.name().toLowerCase(Locale.ROOT));
    apart.forEach(group -> text.append(" --apart ").append(String.join(",", group)));
    new TreeMap<>(keptFor)
        .forEach((piece, rotor) -> text.append(" --keep-for ").append(rotor + "=" + piece));
    if (!without.isEmpty()) {
      text.append(" --without ").append(String.join(",", new TreeSet<>(without)));
    }
    if (seconds != null) {
      text.append(" --seconds ").append(seconds);
    }
    return text.length() <= LONGEST_SETTINGS
        ? text.toString()
        : text.substring(0, LONGEST_SETTINGS - 1) + "…";
  }
}
