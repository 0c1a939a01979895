package lodebook.ui.desk.bench;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.FaultKind;
import lodebook.assembly.survey.Finding;
import lodebook.assembly.survey.Verdict;
import lodebook.reports.ring.DrawnSlot;
import lodebook.reports.ring.RingPicture;
import lodebook.ui.desk.words.DeskWords;
import lodebook.ui.desk.words.SurveySentences;
import lodebook.ui.paper.RingPictures;
import org.jspecify.annotations.Nullable;

/// The ring as the builder should see it, and as it likely is.
final class BenchPictures {
  private final DeskWords words;

  BenchPictures(DeskWords words) {
    this.words = words;
  }

  /// The ring with the step's magnet in; where something is in doubt, as it likely stands, with a
  /// word at each slot.
  RingPicture of(BenchStep step, @Nullable Diagnosis doubt) {
    RingPicture standing = RingPictures.of(step.rotor(), words.locale());
    Map<Integer, DrawnSlot> slots = new HashMap<>();
    standing
        .slots()
        .forEach(s -> slots.put(s.slot(), new DrawnSlot(s.slot(), s.facing(), null, null)));
    slots.put(step.slot(), new DrawnSlot(step.slot(), step.facing(), null, null));
    if (doubt != null && doubt.verdict() == Verdict.FAULT) {
      SurveySentences survey = new SurveySentences(words);
      for (Finding finding : doubt.findings()) {
        DrawnSlot before = slots.get(finding.slot());
        boolean gone = finding.kind() == FaultKind.MISSING;
        slots.put(
            finding.slot(),
            new DrawnSlot(
                finding.slot(),
                gone || before == null
                    ? null
                    : finding.faces() == null ? before.facing() : finding.faces(),
                null,
                survey.mark(finding.kind())));
      }
    }
    List<DrawnSlot> all = new ArrayList<>(slots.values());
    return new RingPicture(
        standing.layout(),
        standing.type(),
        standing.sideType(),
        standing.title(),
        all,
        standing.face(),
        step.slot(),
        List.of(),
        words.locale());
  }
}
