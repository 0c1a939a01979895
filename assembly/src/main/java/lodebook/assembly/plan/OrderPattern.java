package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/// Orders of filling that a person can follow.
public enum OrderPattern {
  /// Slot after slot.
  ROUND_THE_RING {
    @Override
    List<Integer> from(int start, int slots) {
      return stepping(start, slots, 1);
    }
  },
  /// Every second slot, then those between.
  EVERY_SECOND {
    @Override
    List<Integer> from(int start, int slots) {
      return stepping(start, slots, 2);
    }
  },
  /// A slot, the one opposite, the next one, the one opposite that, and so on.
  OPPOSITE_PAIRS {
    @Override
    List<Integer> from(int start, int slots) {
      return inParts(start, slots, 2);
    }
  },
  /// The first slot of each quarter, then the second of each, and so on.
  QUADRANTS {
    @Override
    List<Integer> from(int start, int slots) {
      return inParts(start, slots, 4);
    }
  };

  /// The pattern that some steps follow, or null where they follow none.
  ///
  /// @param filled slots in the order in which they are filled; others are left out
  /// @param slots slots of the ring
  public static @Nullable OrderPattern of(List<Integer> filled, int slots) {
    for (OrderPattern pattern : values()) {
      for (int start = 1; start <= slots; start++) {
        if (pattern.from(start, slots).stream().filter(filled::contains).toList().equals(filled)) {
          return pattern;
        }
      }
    }
    return null;
  }

  /// All slots in this order.
  ///
  /// @param start slot that is filled first, from 1
  /// @param slots slots of the ring
  abstract List<Integer> from(int start, int slots);

  private static List<Integer> stepping(int start, int slots, int step) {
    List<Integer> order = new ArrayList<>();
    for (int first = 0; first < step; first++) {
      for (int i = first; i < slots; i += step) {
        order.add((start - 1 + i) % slots + 1);
      }
    }
    return order;
  }

  private static List<Integer> inParts(int start, int slots, int parts) {
    List<Integer> order = new ArrayList<>();
    int longest = (slots + parts - 1) / parts;
    for (int i = 0; i < longest; i++) {
      for (int part = 0; part < parts; part++) {
        int from = part * slots / parts;
        int to = (part + 1) * slots / parts;
        if (from + i < to) {
          order.add((start - 1 + from + i) % slots + 1);
        }
      }
    }
    return order;
  }
}
