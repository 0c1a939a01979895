package lodebook.assembly.survey;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.function.BiFunction;
import lodebook.assembly.layout.RingDesign;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/// The tables of docs/truth.md, written line by line to `target/truth.md`. Trials per line:
/// `-Dtrials=1000`; rings whose names contain a text only: `-Dring=12`; lines whose names contain a
/// text only: `-Dline=start`; seeds are 100000 and up, one per trial.
@Tag("slow")
class SurveyTruthStudy {
  private static final long SEED = 100_000;
  private static final Path TABLES = Path.of("target/truth.md");

  private final Map<RingDesign, ProbeResponses> responses = new HashMap<>();

  @Test
  void tables() throws IOException {
    tables(
        Integer.getInteger("trials", 1000),
        System.getProperty("ring", ""),
        System.getProperty("line", ""));
  }

  /// The same without a test: number of trials, text in the ring's name, text in the line's.
  public static void main(String[] arguments) throws IOException {
    new SurveyTruthStudy().tables(Integer.parseInt(arguments[0]), arguments[1], arguments[2]);
  }

  private void tables(int trials, String only, String lines) throws IOException {
    for (var ring : rings().entrySet()) {
      if (ring.getKey().contains(only)) {
        boolean wrongModels = ring.getKey().startsWith("wrong models");
        say("\n### " + ring.getKey() + ", " + trials + " trials a line\n");
        say("| survey | right | cannot tell | asked to look | weak, drowned | wrong | by signs |");
        say("| --- | --- | --- | --- | --- | --- | --- |");
        for (var line : ring.getValue().entrySet()) {
          if (line.getKey().contains(lines)) {
            line(trials, line, wrongModels);
          }
        }
      }
    }
  }

  private void line(
      int trials,
      Map.Entry<String, BiFunction<SplittableRandom, Integer, Trials.Trial>> line,
      boolean wrongModel)
      throws IOException {
    Trials.Count count = Trials.run(trials, SEED, responses, line.getValue());
    String signs = line.getKey().matches("[0-4] reversed") ? signs(trials, line) : "";
    say(
        String.format(
            Locale.ROOT,
            "| %s | %d | %d | %d | %d | %d | %s |",
            line.getKey(),
            count.right(),
            count.cannotTell(),
            count.doubted(),
            count.drowned(),
            count.wrongOnes().size(),
            signs));
    count.wrongOnes().stream().limit(2).forEach(w -> System.out.println("<!-- " + w + " -->"));
    boolean held = wrongModel || line.getKey().matches("[0-4] reversed");
    int allowed = held ? Math.max(2, trials / (wrongModel ? 200 : 130)) : trials;
    assertTrue(count.wrongOnes().size() <= allowed, () -> line.getKey() + " " + count.wrongOnes());
  }

  private ProbeResponses shared(RingDesign design) {
    return responses.computeIfAbsent(design, ProbeResponses::new);
  }

  private static void say(String text) throws IOException {
    System.out.println(text);
    Files.createDirectories(TABLES.getParent());
    Files.writeString(TABLES, text + "\n", StandardOpenOption.CREATE, StandardOpenOption.APPEND);
  }

  private String signs(
      int trials, Map.Entry<String, BiFunction<SplittableRandom, Integer, Trials.Trial>> line) {
    int right = 0;
    int tried = Math.min(trials, 1000);
    for (int i = 0; i < tried; i++) {
      Trials.Trial trial = line.getValue().apply(new SplittableRandom(SEED + i), i);
      TreeSet<Integer> truth = new TreeSet<>();
      trial.faults().forEach(f -> truth.add(f.place() + 1));
      if (TrialLines.bySigns(trial, shared(trial.ring().design())).equals(truth)) {
        right++;
      }
    }
    return String.format(Locale.ROOT, "%.0f %%", 100.0 * right / tried);
  }

  private static Map<String, Map<String, BiFunction<SplittableRandom, Integer, Trials.Trial>>>
      rings() {
    Map<String, Map<String, BiFunction<SplittableRandom, Integer, Trials.Trial>>> rings =
        new LinkedHashMap<>();
    rings.put("12 slots, k 4, out, radial only", TrialLines.of(Rings.blocks12(Rings.RADIAL)));
    rings.put(
        "12 slots, k 4, out, radial and tangential", TrialLines.of(Rings.blocks12(Rings.BOTH)));
    rings.put("32 slots, k 4, in, radial only", TrialLines.of(Rings.blocks32(Rings.RADIAL)));
    rings.put(
        "32 slots, k 4, in, radial and tangential", TrialLines.of(Rings.blocks32(Rings.BOTH)));
    rings.put(
        "wrong models on 12 slots, radial and tangential",
        WrongModels.of(Rings.blocks12(Rings.BOTH), Rings.recoil12(Rings.BOTH), Rings.BOTH));
    rings.put(
        "wrong models on 12 slots, radial only",
        WrongModels.of(Rings.blocks12(Rings.RADIAL), Rings.recoil12(Rings.RADIAL), Rings.RADIAL));
    rings.put(
        "wrong models on 32 slots, radial and tangential",
        WrongModels.of(Rings.blocks32(Rings.BOTH), Rings.recoil32(Rings.BOTH), Rings.BOTH));
    rings.put("18 slots, k 3, out, both", TrialLines.of(Rings.blocks18(Rings.BOTH)));
    rings.put("24 slots, k 2, out, both", TrialLines.of(Rings.blocks24(Rings.BOTH)));
    rings.put("40 slots, k 8, out, both", TrialLines.of(Rings.blocks40(Rings.BOTH)));
    rings.put("48 slots, k 4, in, both", TrialLines.of(Rings.blocks48(Rings.BOTH)));
    rings.put("16 rods, k 4, in, recoil 1.05, both", TrialLines.of(Rings.rods16(Rings.BOTH)));
    rings.put("12 arcs, k 4, out, recoil 1.05, both", TrialLines.of(Rings.arcs12(Rings.BOTH)));
    rings.put("20 discs, k 2, out, recoil 1.05, both", TrialLines.of(Rings.discs20(Rings.BOTH)));
    return rings;
  }
}
