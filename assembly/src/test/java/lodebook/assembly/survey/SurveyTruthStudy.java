package lodebook.assembly.survey;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.function.BiFunction;
import lodebook.assembly.layout.RingDesign;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/// The tables of docs/truth.md. Trials per line: `-Dtrials=1000`; ring names that contain a text
/// only: `-Dring=12`.
@Tag("slow")
class SurveyTruthStudy {
  private static final long SEED = 100_000;

  @Test
  void tables() {
    table(Integer.getInteger("trials", 1000), System.getProperty("ring", ""));
  }

  static void table(int trials, String only) {
    for (Map.Entry<String, RingDesign> ring : rings().entrySet()) {
      if (!ring.getKey().contains(only)) {
        continue;
      }
      System.out.printf("%n### %s%n%n", ring.getKey());
      System.out.printf(
          "| survey | right | cannot tell | asked to look | weak, drowned | wrong | by signs right |%n");
      System.out.printf("| --- | --- | --- | --- | --- | --- | --- |%n");
      for (var line : TrialLines.of(ring.getValue()).entrySet()) {
        Trials.Count count = Trials.run(trials, SEED, line.getValue());
        String signs = line.getKey().matches("[0-4] reversed") ? signs(trials, line) : "";
        System.out.printf(
            "| %s | %d | %d | %d | %d | %d | %s |%n",
            line.getKey(),
            count.right(),
            count.cannotTell(),
            count.doubted(),
            count.drowned(),
            count.wrongOnes().size(),
            signs);
        count.wrongOnes().stream().limit(2).forEach(w -> System.out.println("<!-- " + w + " -->"));
        assertTrue(
            count.wrongOnes().size() <= Math.max(1, trials / 100),
            () -> line.getKey() + " " + count + " " + count.wrongOnes().getFirst());
      }
    }
  }

  private static String signs(
      int trials, Map.Entry<String, BiFunction<SplittableRandom, Integer, Trials.Trial>> line) {
    int right = 0;
    for (int i = 0; i < trials; i++) {
      Trials.Trial trial = line.getValue().apply(new SplittableRandom(SEED + i), i);
      TreeSet<Integer> truth = new TreeSet<>();
      trial.faults().forEach(f -> truth.add(f.place() + 1));
      if (TrialLines.bySigns(trial).equals(truth)) {
        right++;
      }
    }
    return String.valueOf(right);
  }

  private static Map<String, RingDesign> rings() {
    Map<String, RingDesign> rings = new LinkedHashMap<>();
    rings.put("12 slots, k 4, out, radial and tangential", Rings.blocks12(Rings.BOTH));
    rings.put("12 slots, k 4, out, radial only", Rings.blocks12(Rings.RADIAL));
    rings.put("32 slots, k 4, in, radial and tangential", Rings.blocks32(Rings.BOTH));
    rings.put("32 slots, k 4, in, radial only", Rings.blocks32(Rings.RADIAL));
    rings.put("18 slots, k 3, out, radial and tangential", Rings.blocks18(Rings.BOTH));
    rings.put("24 slots, k 2, out, radial and tangential", Rings.blocks24(Rings.BOTH));
    rings.put("40 slots, k 8, out, radial and tangential", Rings.blocks40(Rings.BOTH));
    rings.put("48 slots, k 4, in, radial and tangential", Rings.blocks48(Rings.BOTH));
    rings.put("16 rods, k 4, in, recoil 1.05", Rings.rods16(Rings.BOTH));
    rings.put("12 arcs, k 4, out, recoil 1.05", Rings.arcs12(Rings.BOTH));
    rings.put("20 discs, k 2, out, recoil 1.05", Rings.discs20(Rings.BOTH));
    rings.put("12 blocks, k 4, out, recoil 1.05", Rings.recoil12(Rings.BOTH));
    return rings;
  }
}
