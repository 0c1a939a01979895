package lodebook.ui.desk.survey;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.FaultKind;
import lodebook.assembly.survey.Finding;
import lodebook.reports.ring.DrawnSlot;
import lodebook.reports.ring.RingPicture;
import lodebook.ui.desk.words.DeskWords;
import lodebook.ui.desk.words.SurveySentences;
import lodebook.ui.paper.RingPictures;

/// The ring of a round: the band of expected and read values, and what is likely wrong.
final class SurveyPictures {
  private final DeskWords words;

  SurveyPictures(DeskWords words) {
    this.words = words;
  }

  /// The ring as it likely stands.
  RingPicture of(Round round) {
    RingPicture standing = RingPictures.of(round.rotor(), words.locale());
    Map<Integer, DrawnSlot> slots = new HashMap<>();
    standing
        .slots()
        .forEach(s -> slots.put(s.slot(), new DrawnSlot(s.slot(), s.facing(), null, null)));
    Diagnosis diagnosis = round.diagnosis();
    if (diagnosis != null) {
      diagnosis.findings().forEach(f -> slots.put(f.slot(), drawn(f, slots.get(f.slot()))));
    }
    List<DrawnSlot> all = new ArrayList<>(slots.values());
    return new RingPicture(
        standing.layout(),
        standing.type(),
        standing.sideType(),
        standing.title(),
        all,
        standing.face(),
        null,
        round.band(),
        words.locale());
  }

  private DrawnSlot drawn(Finding finding, @org.jspecify.annotations.Nullable DrawnSlot before) {
    Facing stands = before == null ? null : before.facing();
    if (finding.faces() != null) {
      stands = finding.faces();
    }
    return new DrawnSlot(
        finding.slot(),
        finding.kind() == FaultKind.MISSING ? null : stands,
        null,
        new SurveySentences(words).mark(finding.kind()));
  }
}
