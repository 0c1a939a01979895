package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.function.BiFunction;
import java.util.function.Function;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.MutualMagnetisation;
import lodebook.assembly.layout.RingDesign;

/// The kinds of surveys that are tried on every ring.
final class TrialLines {
  private TrialLines() {}

  /// Every line of the table for one ring, by its name.
  static Map<String, BiFunction<SplittableRandom, Integer, Trials.Trial>> of(RingDesign design) {
    int slots = design.slots();
    int part = (int) Math.ceil(0.6 * slots);
    Fault reversed = Fault.of(0, FaultKind.REVERSED);
    Map<String, BiFunction<SplittableRandom, Integer, Trials.Trial>> lines = new LinkedHashMap<>();
    List<Fault> some = new ArrayList<>();
    for (int count = 0; count <= 4; count++) {
      lines.put(count + " reversed", Trials.faults(design, slots, List.copyOf(some)));
      some.add(reversed);
    }
    lines.put("quarter turn forward", one(design, FaultKind.QUARTER_TURN_FORWARD, 0));
    lines.put("quarter turn back", one(design, FaultKind.QUARTER_TURN_BACK, 0));
    lines.put("missing", one(design, FaultKind.MISSING, 0));
    lines.put("weak 0.6", one(design, FaultKind.WEAK, 0.6));
    lines.put("weak 0.8", one(design, FaultKind.WEAK, 0.8));
    lines.put("60 % read, 1 reversed", cutOff(design, List.of(reversed)));
    lines.put("60 % read, right", cutOff(design, List.of()));
    lines.put("60 % filled, right", Trials.faults(design, part, List.of()));
    lines.put("60 % filled, 1 reversed", Trials.faults(design, part, List.of(reversed)));
    lines.put("60 % filled, 2 reversed", Trials.faults(design, part, List.of(reversed, reversed)));
    lines.put(
        "sign inverted",
        slip(
            design,
            random -> measuring(Measuring.Sign.INVERTED, 1, false, Measuring.UnitSlip.AS_STATED)));
    lines.put(
        "other start",
        slip(
            design,
            random ->
                measuring(
                    Measuring.Sign.AS_SET,
                    2 + random.nextInt(slots - 1),
                    false,
                    Measuring.UnitSlip.AS_STATED)));
    lines.put(
        "opposite",
        slip(
            design,
            random -> measuring(Measuring.Sign.AS_SET, 1, true, Measuring.UnitSlip.AS_STATED)));
    lines.put(
        "gauss written as mT",
        slip(
            design,
            random ->
                measuring(
                    Measuring.Sign.AS_SET, 1, false, Measuring.UnitSlip.GAUSS_AS_MILLITESLA)));
    lines.put(
        "mT written as gauss",
        slip(
            design,
            random ->
                measuring(
                    Measuring.Sign.AS_SET, 1, false, Measuring.UnitSlip.MILLITESLA_AS_GAUSS)));
    lines.put("one wild reading", wild(design));
    return lines;
  }

  /// A full ring whose survey was cut off after 60 % of its slots: nothing can be said of the
  /// magnets that nobody read, so a right ring is "cannot tell", and one fault among what was read
  /// is right.
  private static BiFunction<SplittableRandom, Integer, Trials.Trial> cutOff(
      RingDesign design, List<Fault> kinds) {
    int part = (int) Math.ceil(0.6 * design.slots());
    var whole = Trials.faults(design, design.slots(), kinds);
    return (random, i) -> {
      Trials.Trial trial = whole.apply(random, i);
      List<Reading> read =
          trial.readings().stream().filter(reading -> reading.slot() <= part).toList();
      return new Trials.Trial(trial.ring(), read, trial.faults(), trial.truth(), trial.measuring());
    };
  }

  private static BiFunction<SplittableRandom, Integer, Trials.Trial> one(
      RingDesign design, FaultKind kind, double amount) {
    return Trials.faults(design, design.slots(), List.of(new Fault(0, kind, amount)));
  }

  private static Measuring measuring(
      Measuring.Sign sign, int start, boolean opposite, Measuring.UnitSlip unit) {
    return new Measuring(
        sign,
        start,
        opposite ? Measuring.Direction.OPPOSITE : Measuring.Direction.AS_NUMBERED,
        unit);
  }

  private static BiFunction<SplittableRandom, Integer, Trials.Trial> slip(
      RingDesign design, Function<SplittableRandom, Measuring> which) {
    MutualMagnetisation mutual = MutualMagnetisation.of(design);
    return (random, i) -> {
      Measuring measuring = which.apply(random);
      Slip slip = new Slip(measuring, false);
      RingTruth truth = new RingTruth(design, mutual, design.slots(), List.of(), random);
      double gain = Trials.METER.accuracy() * random.nextGaussian();
      return new Trials.Trial(
          truth.recorded(),
          truth.readWith(slip, Trials.METER, gain),
          List.of(),
          Set.of(),
          measuring);
    };
  }

  /// A right ring with one reading whose sign, decimal point or digits are wrong: off by more than
  /// half of the largest reading.
  private static BiFunction<SplittableRandom, Integer, Trials.Trial> wild(RingDesign design) {
    MutualMagnetisation mutual = MutualMagnetisation.of(design);
    return (random, i) -> {
      RingTruth truth = new RingTruth(design, mutual, design.slots(), List.of(), random);
      double gain = Trials.METER.accuracy() * random.nextGaussian();
      List<Reading> readings = new ArrayList<>(truth.read(design.slots(), Trials.METER, gain, 0));
      double largest =
          readings.stream().mapToDouble(r -> Math.abs(r.fluxTesla())).max().orElseThrow();
      int at = random.nextInt(readings.size());
      Reading old = readings.get(at);
      double off = largest * (0.5 + random.nextDouble()) * (random.nextBoolean() ? 1 : -1);
      readings.set(at, RingTruth.withValue(old, old.fluxTesla() + off));
      Set<String> words = new TreeSet<>();
      words.add(old.slot() + " " + FaultKind.SUSPECT_READING.word());
      return new Trials.Trial(truth.recorded(), readings, List.of(), words, Measuring.AS_SET);
    };
  }

  /// The shop's own check: a magnet is called reversed where its slot's largest expected reading
  /// has the wrong sign.
  static Set<Integer> bySigns(Trials.Trial trial, ProbeResponses responses) {
    List<ExpectedReading> expected =
        new ExpectedReadings(trial.ring(), Trials.METER, responses)
            .at(trial.readings().stream().map(Reading::point).toList());
    Map<Integer, Double> most = new LinkedHashMap<>();
    Set<Integer> called = new TreeSet<>();
    for (int i = 0; i < expected.size(); i++) {
      Reading reading = trial.readings().get(i);
      if (reading.component() != Component.RADIAL) {
        continue;
      }
      double value = expected.get(i).valueTesla();
      if (Math.abs(value) > most.getOrDefault(reading.slot(), 0.0)) {
        most.put(reading.slot(), Math.abs(value));
        boolean wrong =
            Math.abs(value) > 2 * expected.get(i).bandTesla() && value * reading.fluxTesla() < 0;
        if (wrong) {
          called.add(reading.slot());
        }
      }
    }
    return called;
  }
}
