package lodebook.db.surveys;

import java.util.List;
import java.util.Set;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.survey.Priors;
import lodebook.assembly.survey.Reading;
import lodebook.assembly.survey.SurveyedRing;

/// Everything that explaining a survey needs, or several surveys of one rotor together.
///
/// @param surveys the surveys' numbers
/// @param rotor the rotor
/// @param design what the rotor is built to
/// @param readings all readings in the order in which they were recorded
/// @param seen the last line of history when it was read
/// @param priors what the shop believes before the first reading
/// @param stages the ring as it stood, and the readings recorded while it stood so; in order
public record RecordedSurvey(
    List<String> surveys,
    String rotor,
    RingDesign design,
    List<RecordedReading> readings,
    long seen,
    Priors priors,
    List<Stage> stages) {
  public RecordedSurvey {
    surveys = List.copyOf(surveys);
    readings = List.copyOf(readings);
    stages = List.copyOf(stages);
  }

  /// The numbers as people write them, `S-12` or `S-12,S-13`.
  public String name() {
    return String.join(",", surveys);
  }

  /// One state of the ring and what was read meanwhile.
  ///
  /// @param ring the ring by the record
  /// @param readings what was read
  /// @param from the survey of each reading
  /// @param changedSince slots whose magnet was changed between this stage and the last
  public record Stage(
      SurveyedRing ring, List<Reading> readings, List<String> from, Set<Integer> changedSince) {
    public Stage {
      from = List.copyOf(from);
      readings = List.copyOf(readings);
      changedSince = Set.copyOf(changedSince);
    }
  }
}
