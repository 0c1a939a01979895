package lodebook.assembly.survey;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.function.BiFunction;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.RingDesign;

/// Surveys whose readings come from something else than the explainer is told: 0, 1 or 2 magnets
/// reversed by turns.
final class WrongModels {
  private static final Fault REVERSED = Fault.of(0, FaultKind.REVERSED);

  /// 5 K at −0.12 % per kelvin, which all readings share.
  private static final double FIVE_KELVIN = -0.006;

  private WrongModels() {}

  static Map<String, BiFunction<SplittableRandom, Integer, Trials.Trial>> of(
      RingDesign blocks, RingDesign recoil, List<Component> components) {
    Map<String, BiFunction<SplittableRandom, Integer, Trials.Trial>> lines = new LinkedHashMap<>();
    lines.put("recoil permeability 1.05 taken for 1", byTurns(recoil, blocks, 0, 0));
    lines.put("meter 3 % high", byTurns(blocks, blocks, 0.03, 0));
    lines.put("meter 3 % low", byTurns(blocks, blocks, -0.03, 0));
    lines.put("probe 0.3 mm too far out", byTurns(blocks, blocks, 0, 0.3e-3));
    lines.put("5 K too warm, unreported", byTurns(blocks, blocks, FIVE_KELVIN, 0));
    lines.put(
        "arcs taken for blocks (12 slots)",
        byTurns(
            Rings.arcs12(components),
            Rings.ring(3, 4, Focus.OUT, 10, 13.2, Rings.block(4, 4.7, 10), components),
            0,
            0));
    return lines;
  }

  private static BiFunction<SplittableRandom, Integer, Trials.Trial> byTurns(
      RingDesign really, RingDesign recordedAs, double gain, double outwards) {
    int slots = really.slots();
    var none = Trials.faults(really, recordedAs, slots, List.of(), gain, outwards);
    var one = Trials.faults(really, recordedAs, slots, List.of(REVERSED), gain, outwards);
    var two = Trials.faults(really, recordedAs, slots, List.of(REVERSED, REVERSED), gain, outwards);
    return (random, i) ->
        switch (i % 3) {
          case 0 -> none.apply(random, i);
          case 1 -> one.apply(random, i);
          default -> two.apply(random, i);
        };
  }
}
