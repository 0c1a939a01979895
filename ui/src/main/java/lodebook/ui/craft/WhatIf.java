package lodebook.ui.craft;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import lodebook.assembly.plan.Arranged;
import lodebook.assembly.plan.PullOutSpread;
import lodebook.assembly.plan.RingFigures;
import lodebook.db.builds.Rotor;
import org.jspecify.annotations.Nullable;

/// The same pieces as they come, sorted by strength, and planned; nothing of it is stored.
///
/// @param rotors the rotors in the order of the wish
/// @param figures for each arrangement and rotor
public record WhatIf(List<Rotor> rotors, Map<Arranged, Map<String, RingFigures>> figures) {
  public WhatIf {
    rotors = List.copyOf(rotors);
  }

  /// Relative standard deviation of the pull-out torques of the gears whose two rings are among the
  /// rotors, or null where there are fewer than two such gears.
  public @Nullable Double pullOutSpread(Arranged how) {
    Map<String, RingFigures> each = figures.getOrDefault(how, Map.of());
    Map<String, Map<String, RingFigures>> gears = new TreeMap<>();
    for (Rotor rotor : rotors) {
      RingFigures ring = each.get(rotor.code());
      if (ring != null && rotor.gearNumber() != null && rotor.ring() != null) {
        gears
            .computeIfAbsent(rotor.batch() + " " + rotor.gearNumber(), gear -> new HashMap<>())
            .put(rotor.ring(), ring);
      }
    }
    List<Double> inner = new ArrayList<>();
    List<Double> outer = new ArrayList<>();
    for (Map<String, RingFigures> gear : gears.values()) {
      RingFigures in = gear.get("inner");
      RingFigures out = gear.get("outer");
      if (in != null && out != null) {
        inner.add(in.workingAmplitudeTesla());
        outer.add(out.workingAmplitudeTesla());
      }
    }
    return inner.size() < 2 ? null : PullOutSpread.relative(array(inner), array(outer));
  }

  private static double[] array(List<Double> values) {
    return values.stream().mapToDouble(value -> value).toArray();
  }
}
