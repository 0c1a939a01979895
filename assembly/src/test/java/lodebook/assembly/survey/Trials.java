package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.function.BiFunction;
import java.util.stream.Collectors;
import lodebook.assembly.layout.MutualMagnetisation;
import lodebook.assembly.layout.RingDesign;

/// Counts how often surveys with a known truth are explained rightly.
final class Trials {
  static final Meter METER = new Meter("trial", 0.01, 0.2e-3);

  /// @param right the truth was said
  /// @param doubted something else was said, but with the request to look whether the pocket is
  ///   empty that is the truth
  /// @param drowned a weak magnet passed although the readings speak less than 20 to 1 for it
  /// @param cannotTell nothing was claimed
  /// @param wrongOnes where something else was claimed
  /// @param unsureOnes where nothing was claimed
  record Count(
      int right,
      int doubted,
      int drowned,
      int cannotTell,
      List<String> wrongOnes,
      List<String> unsureOnes) {
    @Override
    public String toString() {
      return "right "
          + right
          + ", doubted "
          + doubted
          + ", drowned "
          + drowned
          + ", cannot tell "
          + cannotTell
          + ", wrong "
          + wrongOnes.size();
    }
  }

  /// One survey and what would be right to say of it.
  record Trial(
      SurveyedRing ring,
      List<Reading> readings,
      List<Fault> faults,
      Set<String> truth,
      Measuring measuring) {}

  private Trials() {}

  static Count run(int count, long seed, BiFunction<SplittableRandom, Integer, Trial> make) {
    return run(count, seed, new HashMap<>(), make);
  }

  /// @param shared responses of designs, kept between lines
  static Count run(
      int count,
      long seed,
      Map<RingDesign, ProbeResponses> shared,
      BiFunction<SplittableRandom, Integer, Trial> make) {
    int right = 0;
    int doubted = 0;
    int drowned = 0;
    int unsure = 0;
    List<String> wrong = new ArrayList<>();
    List<String> unsureOnes = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      Trial trial = make.apply(new SplittableRandom(seed + i), i);
      ProbeResponses responses = shared.computeIfAbsent(trial.ring().design(), ProbeResponses::new);
      Diagnosis said =
          new SurveyExplainer(trial.ring(), Priors.DEFAULT, responses).explain(trial.readings());
      if (isRight(trial, said)) {
        right++;
      } else if (said.verdict() == Verdict.CANNOT_TELL) {
        unsure++;
        unsureOnes.add("seed " + (seed + i) + ": " + trial.truth() + " but " + brief(said));
      } else if (isDoubted(trial, said)) {
        doubted++;
      } else if (isDrowned(trial, said, responses)) {
        drowned++;
      } else {
        wrong.add("seed " + (seed + i) + ": " + trial.truth() + " but " + brief(said));
      }
    }
    return new Count(right, doubted, drowned, unsure, wrong, unsureOnes);
  }

  static String brief(Diagnosis said) {
    return said.verdict().word()
        + " "
        + said.findings().stream()
            .map(f -> f.slot() + " " + f.kind().word() + " " + f.strengthShare())
            .toList()
        + " "
        + said.reason()
        + " fit "
        + said.fitProbability()
        + " next "
        + said.runnerUp()
        + " whole "
        + said.wholeRing()
        + " "
        + said.measuring();
  }

  private static boolean isRight(Trial trial, Diagnosis said) {
    Set<String> names =
        said.findings().stream()
            .map(f -> f.slot() + " " + f.kind().word())
            .collect(Collectors.toCollection(TreeSet::new));
    boolean wild = trial.truth().stream().anyMatch(t -> t.endsWith("suspect reading"));
    Verdict verdict =
        trial.truth().isEmpty() ? Verdict.PASS : wild ? Verdict.CANNOT_TELL : Verdict.FAULT;
    boolean measured =
        said.measuring().equals(trial.measuring())
            || said.measuringAlternatives().contains(trial.measuring());
    return said.verdict() == verdict
        && measured
        && (names.equals(trial.truth()) || lookAlike(trial, said));
  }

  /// Whether the truth is an empty pocket into which a person is asked to look.
  private static boolean isDoubted(Trial trial, Diagnosis said) {
    Set<String> doubts =
        said.measureNext().stream()
            .filter(m -> m.why() == MeasureNext.Why.EMPTY_POCKET_ALIKE)
            .flatMap(m -> m.magnets().stream())
            .map(f -> f.slot() + " " + f.kind().word())
            .collect(Collectors.toSet());
    return !trial.truth().isEmpty() && doubts.containsAll(trial.truth());
  }

  /// Whether a ring with a weak magnet passed that the readings, each weighed with the covariance
  /// of the truth, make less than 20 times as likely as a right ring.
  private static boolean isDrowned(Trial trial, Diagnosis said, ProbeResponses responses) {
    boolean weak = trial.faults().stream().anyMatch(f -> f.kind() == FaultKind.WEAK);
    if (!weak || said.verdict() != Verdict.PASS) {
      return false;
    }
    RingModel ring = new RingModel(trial.ring(), responses);
    RowModel rows = new RowModel(ring, Slip.NONE.rows(trial.readings(), ring.layout()));
    double gain =
        logLikelihood(rows, new Explanation(trial.faults()))
            - logLikelihood(rows, Explanation.NONE);
    return gain < Math.log(20);
  }

  private static double logLikelihood(RowModel rows, Explanation explanation) {
    Cholesky factor = new Cholesky(rows.covariance(explanation));
    double[] mean = rows.mean(explanation);
    double[] residual = rows.read();
    for (int i = 0; i < residual.length; i++) {
      residual[i] -= mean[i];
    }
    double[] white = factor.whiten(residual);
    return -0.5 * (factor.logDeterminant() + Judge.dot(white, white));
  }

  /// Whether the truth is among the slots that look-alike slips leave possible.
  private static boolean lookAlike(Trial trial, Diagnosis said) {
    return said.findings().size() == trial.faults().size()
        && trial.faults().stream()
            .allMatch(
                fault ->
                    said.findings().stream()
                        .anyMatch(
                            f ->
                                f.kind() == fault.kind()
                                    && (f.slot() == fault.place() + 1
                                        || f.alsoPossibleSlots().contains(fault.place() + 1))));
  }

  static Set<String> words(List<Fault> faults) {
    return faults.stream()
        .map(f -> f.place() + 1 + " " + f.kind().word())
        .collect(Collectors.toCollection(TreeSet::new));
  }

  /// Surveys of a ring with some faults of given kinds in random slots.
  static BiFunction<SplittableRandom, Integer, Trial> faults(
      RingDesign design, int filled, List<Fault> kinds) {
    return faults(design, design, filled, kinds, 0, 0);
  }

  /// The same where the ring really is another one than the record says, or is read otherwise.
  ///
  /// @param really the ring as it is
  /// @param recordedAs what the explainer takes it for
  /// @param gainOff gain error on top of the meter's own
  /// @param outwards how much farther out than stated the probe always stands, metres
  static BiFunction<SplittableRandom, Integer, Trial> faults(
      RingDesign really,
      RingDesign recordedAs,
      int filled,
      List<Fault> kinds,
      double gainOff,
      double outwards) {
    MutualMagnetisation mutual = MutualMagnetisation.of(really);
    return (random, i) -> {
      List<Integer> slots = new ArrayList<>();
      while (slots.size() < kinds.size()) {
        int slot = random.nextInt(filled);
        if (!slots.contains(slot)) {
          slots.add(slot);
        }
      }
      List<Fault> faults = new ArrayList<>();
      for (int k = 0; k < kinds.size(); k++) {
        faults.add(new Fault(slots.get(k), kinds.get(k).kind(), kinds.get(k).amount()));
      }
      RingTruth truth = new RingTruth(really, mutual, filled, faults, random);
      double gain = METER.accuracy() * random.nextGaussian() + gainOff;
      return new Trial(
          new SurveyedRing(recordedAs, truth.recorded().magnets()),
          truth.read(filled, METER, gain, outwards),
          faults,
          words(faults),
          Measuring.AS_SET);
    };
  }

  /// Surveys of a whole ring with given faults in given slots.
  static BiFunction<SplittableRandom, Integer, Trial> inSlots(
      RingDesign design, List<Fault> faults) {
    MutualMagnetisation mutual = MutualMagnetisation.of(design);
    return (random, i) -> {
      RingTruth truth = new RingTruth(design, mutual, design.slots(), faults, random);
      double gain = METER.accuracy() * random.nextGaussian();
      return new Trial(
          truth.recorded(),
          truth.read(design.slots(), METER, gain, 0),
          faults,
          words(faults),
          Measuring.AS_SET);
    };
  }
}
