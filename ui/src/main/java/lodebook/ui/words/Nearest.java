package lodebook.ui.words;

import java.util.Collection;
import java.util.Locale;
import org.jspecify.annotations.Nullable;

/// The known word nearest to a mistyped one.
public final class Nearest {
  private Nearest() {}

  /// The candidate with the fewest letters to change (Levenshtein's distance, case aside), the
  /// first of equals, or null where even that needs more than a third of the word (at least two
  /// letters).
  public static @Nullable String to(String word, Collection<String> candidates) {
    String best = null;
    int least = Math.max(2, word.length() / 3) + 1;
    for (String candidate : candidates) {
      int distance = distance(word.toLowerCase(Locale.ROOT), candidate.toLowerCase(Locale.ROOT));
      if (distance < least) {
        least = distance;
        best = candidate;
      }
    }
    return best;
  }

  private static int distance(String a, String b) {
    int[] before = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      before[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int[] now = new int[b.length() + 1];
      now[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int changed = before[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        now[j] = Math.min(changed, 1 + Math.min(before[j], now[j - 1]));
      }
      before = now;
    }
    return before[b.length()];
  }
}
