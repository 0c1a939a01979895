package lodebook.ui.demo;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.Facing;
import tools.jackson.databind.JsonNode;

/// One planned rotor as the builder follows it: a piece and a facing for every slot.
///
/// @param rotor its serial number
/// @param pieces slot 1 first
/// @param facings slot 1 first, as planned
record BuiltRotor(String rotor, List<String> pieces, List<Facing> facings) {
  /// Reads one plan of the JSON that `plan` prints.
  static BuiltRotor of(JsonNode plan) {
    int slots = plan.get("placements").size();
    String[] pieces = new String[slots];
    Facing[] facings = new Facing[slots];
    for (JsonNode placement : plan.get("placements")) {
      int at = placement.get("slot").asInt() - 1;
      pieces[at] = placement.get("piece").asString();
      facings[at] = new Facing(placement.get("facingDegrees").asDouble());
    }
    return new BuiltRotor(plan.get("rotor").asString(), List.of(pieces), List.of(facings));
  }

  /// The first slot whose magnet lies along the ring, from the middle of the ring on.
  int slotLyingAlong() {
    for (int i = facings.size() / 2; i < facings.size(); i++) {
      if (Math.abs(Math.sin(facings.get(i).radians())) > 0.9) {
        return i + 1;
      }
    }
    throw new IllegalStateException("no magnet of " + rotor + " lies along the ring");
  }

  /// The facings with one magnet the wrong way round.
  List<Facing> withReversed(int slot) {
    List<Facing> wrong = new ArrayList<>(facings);
    wrong.set(slot - 1, facings.get(slot - 1).reversed());
    return wrong;
  }

  /// The rows of a placements file for some slots.
  String placements(List<Integer> slots) {
    StringBuilder rows = new StringBuilder("slot,piece,facing_deg\n");
    for (int slot : slots) {
      rows.append(
          String.format(
              Locale.ROOT,
              "%d,%s,%.1f\n",
              slot,
              pieces.get(slot - 1),
              facings.get(slot - 1).degrees()));
    }
    return rows.toString();
  }

  /// All slots, from 1.
  List<Integer> slots() {
    List<Integer> all = new ArrayList<>();
    for (int slot = 1; slot <= pieces.size(); slot++) {
      all.add(slot);
    }
    return all;
  }
}
