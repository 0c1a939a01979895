package lodebook.ui.desk.bench;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.Evidence;
import lodebook.assembly.survey.Finding;
import lodebook.ui.desk.room.Said;
import lodebook.ui.desk.words.DeskWords;
import lodebook.ui.desk.words.SurveySentences;

/// What the bench says: short, in the order in which hands move.
final class BenchWords {
  private final DeskWords words;
  private final SurveySentences survey;

  BenchWords(DeskWords words) {
    this.words = words;
    this.survey = new SurveySentences(words);
  }

  /// "Slot 7: tray C cell 9, north OUT".
  String sentence(BenchStep step) {
    String facing = survey.facing(step.design().layout(), step.slot(), step.facing());
    String slot = words.number(step.slot());
    if (step.placed()) {
      return words.say("bench.sentence.placed", slot, facing);
    }
    String cell = step.cell();
    String tray = step.tray();
    if (tray != null && cell != null) {
      return words.say("bench.sentence.tray", slot, tray, cell, facing);
    }
    return words.say("bench.sentence.lot", slot, step.magnet(), facing);
  }

  /// Where the step stands: "R-9, step 3 of 12, L-2404/0017".
  String place(BenchStep step) {
    return words.say(
        "bench.place",
        step.code(),
        words.number(step.step()),
        words.number(step.of()),
        step.magnet());
  }

  /// Which reading is to be taken, and what it should come to.
  String ask(BenchStep step) {
    if (step.toRead().isEmpty()) {
      return "";
    }
    ProbePoint point = step.toRead().getFirst();
    String key =
        point.spot() == Spot.TO_NEXT
            ? "bench.ask.to-next"
            : point.component() == Component.RADIAL ? "bench.ask.radial" : "bench.ask.tangential";
    var expected = step.expected().getFirst();
    return words.say(
        key,
        words.number(point.slot()),
        words.milliTesla(expected.valueTesla()),
        words.milliTesla(expected.bandTesla()),
        survey.component(point.component()));
  }

  /// What a reading came to.
  Said outcome(Outcome outcome) {
    BenchStep step = outcome.after();
    String slot = words.number(step.slot());
    Diagnosis diagnosis = outcome.diagnosis();
    return switch (outcome.kind()) {
      case RIGHT -> Said.of(Said.Tone.RIGHT, words.say("bench.right", slot));
      case CANNOT_TELL -> {
        List<String> rows = new ArrayList<>();
        if (diagnosis != null && !diagnosis.measureNext().isEmpty()) {
          rows.add(survey.next(diagnosis.measureNext().getFirst()));
        }
        yield new Said(Said.Tone.OPEN, words.say("bench.cannot-tell", slot), rows);
      }
      case FAULT -> fault(step, diagnosis);
      case UNEXPLAINED -> {
        List<String> rows = new ArrayList<>();
        if (diagnosis != null) {
          rows.addAll(survey.measuring(diagnosis));
        }
        rows.add(words.say("bench.unexplained.do"));
        yield new Said(Said.Tone.WRONG, words.say("bench.unexplained", slot), rows);
      }
    };
  }

  private Said fault(BenchStep step, @org.jspecify.annotations.Nullable Diagnosis diagnosis) {
    if (diagnosis == null || diagnosis.findings().isEmpty()) {
      return Said.of(Said.Tone.WRONG, words.say("bench.unexplained", step.slot()));
    }
    List<String> rows = new ArrayList<>();
    Finding first = diagnosis.findings().getFirst();
    for (Evidence evidence : first.readings()) {
      rows.add(
          words.say(
              "bench.evidence",
              survey.point(evidence.point()),
              words.milliTesla(evidence.expectedTesla()),
              words.milliTesla(evidence.readTesla())));
    }
    rows.add(survey.remedy(first, step.design().layout()));
    for (Finding more : diagnosis.findings().subList(1, diagnosis.findings().size())) {
      rows.add(survey.finding(more, step.design().layout()));
    }
    return new Said(Said.Tone.WRONG, survey.finding(first, step.design().layout()), rows);
  }
}
