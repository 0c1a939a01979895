package lodebook.ui.craft;

import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import lodebook.assembly.plan.BatchTask;
import lodebook.assembly.plan.Candidate;
import lodebook.assembly.plan.LotsApart;
import lodebook.db.builds.MagnetName;
import lodebook.db.builds.PlanStock;
import lodebook.db.refusal.Refusal;

/// A stock with a person's wishes laid upon it: names as the book has them, pieces that are not
/// used left out; wishes that cannot be are refused.
///
/// @param candidates measured pieces that may be used
/// @param wished pieces that must be used, with the rotor that must have them
/// @param apart lots that must not go together
record WishedStock(List<Candidate> candidates, Map<String, String> wished, LotsApart apart) {

  static WishedStock of(PlanStock stock, PlanWish wish) {
    Map<String, Candidate> offered = new HashMap<>();
    stock.candidates().forEach(each -> offered.put(folded(each.piece()), each));
    Map<String, String> rotors = new HashMap<>();
    stock.rings().forEach(ring -> rotors.put(folded(ring.rotor()), ring.rotor()));
    Set<String> out = new HashSet<>();
    wish.without().forEach(piece -> out.add(folded(MagnetName.of(piece).toString())));
    Map<String, String> wished = new HashMap<>();
    wish.keptFor()
        .forEach(
            (piece, forRotor) -> {
              String name = MagnetName.of(piece).toString();
              String rotor = rotors.get(folded(forRotor));
              if (rotor == null) {
                out.add(folded(name));
              } else {
                wished.put(requireOffered(offered, out, name, rotor), rotor);
              }
            });
    stock.rings().forEach(ring -> requireRoom(ring, offered, wished));
    List<Candidate> candidates =
        stock.candidates().stream().filter(each -> !out.contains(folded(each.piece()))).toList();
    LotsApart apart = new LotsApart(wish.apart().stream().map(g -> named(g, stock)).toList());
    return new WishedStock(candidates, wished, apart);
  }

  private static String requireOffered(
      Map<String, Candidate> offered, Set<String> out, String name, String rotor) {
    Candidate piece = offered.get(folded(name));
    if (piece == null || out.contains(folded(name))) {
      throw Refusal.refused("plan.wish-not-free", name, rotor)
          .remedy("lodebook piece show " + name);
    }
    return piece.piece();
  }

  private static void requireRoom(
      BatchTask.Ring ring, Map<String, Candidate> offered, Map<String, String> wished) {
    Map<String, Integer> count = new HashMap<>();
    wished.forEach(
        (piece, rotor) -> {
          Candidate each = offered.get(folded(piece));
          if (each != null && rotor.equals(ring.rotor())) {
            count.merge(each.type(), 1, Integer::sum);
          }
        });
    count.forEach(
        (type, wanted) -> {
          long room =
              IntStream.rangeClosed(1, ring.design().slots())
                  .filter(slot -> ring.design().layout().typeAt(slot).equals(type))
                  .filter(slot -> ring.kept().stream().noneMatch(kept -> kept.slot() == slot))
                  .count();
          if (wanted > room) {
            throw Refusal.refused("plan.wish-no-room", wanted, type, ring.rotor(), room)
                .remedy("lodebook rotor show " + ring.rotor());
          }
        });
  }

  /// A group of lots that are apart as the book writes them; each must be one of those planned from
  /// or stand in one of the rotors, and all of one type.
  private static Set<String> named(Set<String> group, PlanStock stock) {
    Map<String, String> known = new HashMap<>();
    stock.rings().stream()
        .flatMap(ring -> ring.kept().stream())
        .forEach(kept -> known.put(folded(kept.lot()), kept.lot()));
    Map<String, String> types = new HashMap<>();
    stock.candidates().forEach(each -> types.put(each.lot(), each.type()));
    stock.unmeasured().forEach(each -> types.put(each.lot(), each.type()));
    types.keySet().forEach(lot -> known.put(folded(lot), lot));
    Set<String> lots = new LinkedHashSet<>();
    for (String each : group) {
      String lot = known.get(folded(each));
      if (lot == null) {
        throw Refusal.refused("plan.apart-unknown", each).remedy("lodebook lot list");
      }
      lots.add(lot);
    }
    Set<String> ofTypes =
        lots.stream()
            .filter(types::containsKey)
            .map(lot -> types.getOrDefault(lot, ""))
            .collect(Collectors.toCollection(TreeSet::new));
    if (ofTypes.size() > 1) {
      throw Refusal.refused("plan.apart-types", String.join(", ", lots), String.join(", ", ofTypes))
          .remedy("lodebook lot list");
    }
    return lots;
  }

  private static String folded(String name) {
    return name.toLowerCase(Locale.ROOT);
  }
}
