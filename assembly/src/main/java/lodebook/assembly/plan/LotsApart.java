package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/// Lots that must not go together in one rotor.
///
/// @param groups of each group a rotor takes one lot at most
public record LotsApart(List<Set<String>> groups) {
  /// Every lot may go with every other.
  public static final LotsApart NONE = new LotsApart(List.of());

  public LotsApart {
    groups = groups.stream().<Set<String>>map(LinkedHashSet::new).toList();
  }

  /// Whether some lots may go where others are already; what is there already is no offence.
  boolean allow(Set<String> lots, Set<String> there) {
    return groups.stream()
        .noneMatch(
            group -> {
              long added =
                  lots.stream().filter(group::contains).filter(l -> !there.contains(l)).count();
              boolean before = there.stream().anyMatch(group::contains);
              return added > 1 || (added == 1 && before);
            });
  }

  /// The largest sets of lots that may go where some are already; all of them where nothing is
  /// apart. Those that are there are in every set.
  List<Set<String>> largest(Set<String> lots, Set<String> there) {
    List<Set<String>> sets = List.of(new LinkedHashSet<>(lots));
    for (Set<String> group : groups) {
      List<Set<String>> divided = new ArrayList<>();
      for (Set<String> set : sets) {
        List<String> members = set.stream().filter(group::contains).toList();
        List<String> choice =
            there.stream().anyMatch(group::contains)
                ? List.of("")
                : members.size() < 2 ? List.of() : members;
        if (choice.isEmpty()) {
          divided.add(set);
        }
        for (String taken : choice) {
          Set<String> without = new LinkedHashSet<>(set);
          without.removeIf(l -> group.contains(l) && !l.equals(taken) && !there.contains(l));
          divided.add(without);
        }
      }
      sets = divided.stream().distinct().toList();
    }
    return sets;
  }
}
