package lodebook.assembly.survey;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.SplittableRandom;
import lodebook.assembly.layout.RingDesign;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/// Of the findings said with a probability, that share is right: counted in a shop whose magnets go
/// wrong as [Priors#DEFAULT] says. Writes the table `target/calibration.md` and the picture
/// `target/calibration.svg`; `-Dtrials=4000` surveys of each ring.
@Tag("slow")
class CalibrationStudy {
  private static final double[] EDGES = {0, 0.5, 0.8, 0.9, 0.95, 0.99, 0.999, 1.0000001};
  private static final long SEED = 400_000;

  /// Findings of one range of stated probabilities.
  private static final class Range {
    int said;
    int right;
    double stated;
  }

  @Test
  void findingsAreRightAsOftenAsTheySay() throws IOException {
    int trials = Integer.getInteger("trials", 4000);
    Range[] ranges = new Range[EDGES.length - 1];
    for (int i = 0; i < ranges.length; i++) {
      ranges[i] = new Range();
    }
    count(ranges, Rings.blocks12(Rings.RADIAL), trials);
    count(ranges, Rings.blocks12(Rings.BOTH), trials);
    Files.createDirectories(Path.of("target"));
    Files.writeString(Path.of("target", "calibration.md"), table(ranges));
    Files.writeString(Path.of("target", "calibration.svg"), picture(ranges));
    for (Range range : ranges) {
      double mean = range.stated / Math.max(1, range.said);
      double error = Math.sqrt(mean * (1 - mean) / Math.max(1, range.said));
      double off = range.right / (double) Math.max(1, range.said) - mean;
      assertTrue(range.said < 30 || Math.abs(off) < 0.02 + 4 * error, () -> table(ranges));
    }
  }

  private static void count(Range[] ranges, RingDesign design, int trials) {
    Map<RingDesign, ProbeResponses> shared = new HashMap<>();
    for (int i = 0; i < trials; i++) {
      SplittableRandom random = new SplittableRandom(SEED + i);
      Trials.Trial trial = Trials.inSlots(design, faults(design.slots(), random)).apply(random, i);
      ProbeResponses responses = shared.computeIfAbsent(design, ProbeResponses::new);
      Diagnosis said =
          new SurveyExplainer(trial.ring(), Priors.DEFAULT, responses).explain(trial.readings());
      for (Finding finding : said.findings()) {
        if (finding.kind() != FaultKind.SUSPECT_READING) {
          count(ranges, finding, words(trial.faults()));
        }
      }
    }
  }

  private static void count(Range[] ranges, Finding finding, Set<String> truth) {
    int i = 0;
    while (finding.probability() >= EDGES[i + 1]) {
      i++;
    }
    ranges[i].said++;
    ranges[i].stated += finding.probability();
    if (truth.contains(finding.slot() + " " + finding.kind().word())) {
      ranges[i].right++;
    }
  }

  /// What would be right to say: below a fifth of its strength a magnet is called missing, and from
  /// a tenth to three tenths both words are right.
  private static Set<String> words(List<Fault> faults) {
    Set<String> words = new HashSet<>();
    for (Fault fault : faults) {
      String slot = fault.place() + 1 + " ";
      boolean weak = fault.kind() == FaultKind.WEAK;
      if (!weak || fault.amount() >= 0.1) {
        words.add(slot + fault.kind().word());
      }
      if (weak && fault.amount() < 0.3) {
        words.add(slot + FaultKind.MISSING.word());
      }
    }
    return words;
  }

  /// Faults as the priors have them: reversals in company, the rest each by itself.
  private static List<Fault> faults(int slots, SplittableRandom random) {
    Priors priors = Priors.DEFAULT;
    List<Fault> faults = new ArrayList<>();
    List<Integer> free = new ArrayList<>();
    for (int slot = 0; slot < slots; slot++) {
      free.add(slot);
    }
    for (int n = reversals(slots, random); n > 0; n--) {
      Collections.swap(free, random.nextInt(free.size()), free.size() - 1);
      faults.add(Fault.of(free.removeLast(), FaultKind.REVERSED));
    }
    for (int slot : free) {
      double chance = random.nextDouble();
      if (chance < priors.quarterTurn()) {
        faults.add(Fault.of(slot, FaultKind.QUARTER_TURN_FORWARD));
      } else if (chance < 2 * priors.quarterTurn()) {
        faults.add(Fault.of(slot, FaultKind.QUARTER_TURN_BACK));
      } else if (chance < 2 * priors.quarterTurn() + priors.missing()) {
        faults.add(Fault.of(slot, FaultKind.MISSING));
      } else if (chance < 2 * priors.quarterTurn() + priors.missing() + priors.weak()) {
        faults.add(new Fault(slot, FaultKind.WEAK, share(random)));
      }
    }
    return faults;
  }

  private static int reversals(int slots, SplittableRandom random) {
    double[] weight = {1, 0, 0, 0, 0};
    double each = Priors.DEFAULT.reversed() / (1 - Priors.DEFAULT.reversed());
    double further = Priors.DEFAULT.furtherReversed() / (1 - Priors.DEFAULT.furtherReversed());
    double all = 1;
    for (int n = 1; n < weight.length; n++) {
      double ways = n == 1 ? slots * each : weight[n - 1] * (slots - n + 1) / n * further;
      weight[n] = ways;
      all += ways;
    }
    double at = random.nextDouble() * all;
    int n = 0;
    while (at >= weight[n]) {
      at -= weight[n];
      n++;
    }
    return n;
  }

  /// The strength left, 0.05 to 0.9, likelier the farther from 1: density as the square of what is
  /// missing.
  private static double share(SplittableRandom random) {
    double least = Math.pow(0.1, 3);
    double most = Math.pow(0.95, 3);
    return 1 - Math.cbrt(least + (most - least) * random.nextDouble());
  }

  private static String table(Range[] ranges) {
    StringBuilder text = new StringBuilder();
    text.append("| said with probability | findings | mean said | right | share |\n");
    text.append("| --- | --- | --- | --- | --- |\n");
    for (int i = 0; i < ranges.length; i++) {
      if (ranges[i].said > 0) {
        text.append(
            String.format(
                Locale.ROOT,
                "| %.3f to %.3f | %d | %.4f | %d | %.4f |%n",
                EDGES[i],
                Math.min(1, EDGES[i + 1]),
                ranges[i].said,
                ranges[i].stated / ranges[i].said,
                ranges[i].right,
                ranges[i].right / (double) ranges[i].said));
      }
    }
    return text.toString();
  }

  /// Stated against counted, both axes 0 to 1, with bars of two binomial standard deviations.
  private static String picture(Range[] ranges) {
    StringBuilder svg = new StringBuilder();
    svg.append("<svg xmlns='http://www.w3.org/2000/svg' viewBox='0 0 460 460' ");
    svg.append("font-family='sans-serif' font-size='14'>\n");
    svg.append("<rect width='460' height='460' fill='#ffffff'/>\n");
    line(svg, 60, 400, 420, 40, "#a9aeb1", "4 3");
    line(svg, 60, 400, 420, 400, "#26292c", "none");
    line(svg, 60, 400, 60, 40, "#26292c", "none");
    for (int tenth = 0; tenth <= 10; tenth += 2) {
      double at = tenth / 10.0;
      text(svg, 60 + 360 * at, 420, "middle", String.format(Locale.ROOT, "%.1f", at));
      text(svg, 52, 405 - 360 * at, "end", String.format(Locale.ROOT, "%.1f", at));
    }
    text(svg, 240, 446, "middle", "probability said");
    text(svg, 66, 26, "start", "share of findings that are right");
    for (Range range : ranges) {
      if (range.said > 0) {
        double share = range.right / (double) range.said;
        double bar = 2 * Math.sqrt(share * (1 - share) / range.said);
        double x = 60 + 360 * range.stated / range.said;
        double top = Math.min(1, share + bar);
        double bottom = Math.max(0, share - bar);
        line(svg, x, 400 - 360 * top, x, 400 - 360 * bottom, "#26292c", "none");
        svg.append(
            String.format(
                Locale.ROOT,
                "<circle cx='%.1f' cy='%.1f' r='4' fill='#dd9467' stroke='#26292c'/>%n",
                x,
                400 - 360 * share));
      }
    }
    return svg.append("</svg>\n").toString();
  }

  private static void line(
      StringBuilder svg, double x1, double y1, double x2, double y2, String color, String dash) {
    svg.append(
        String.format(
            Locale.ROOT,
            "<line x1='%.1f' y1='%.1f' x2='%.1f' y2='%.1f' stroke='%s' stroke-dasharray='%s'/>%n",
            x1,
            y1,
            x2,
            y2,
            color,
            dash));
  }

  private static void text(StringBuilder svg, double x, double y, String anchor, String words) {
    svg.append(
        String.format(
            Locale.ROOT,
            "<text x='%.1f' y='%.1f' text-anchor='%s' fill='#26292c'>%s</text>%n",
            x,
            y,
            anchor,
            words));
  }
}
