package lodebook.ui.desk.survey;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.plan.BatchTask;
import lodebook.assembly.survey.ExpectedReading;
import lodebook.assembly.survey.ExpectedReadings;
import lodebook.assembly.survey.Finding;
import lodebook.assembly.survey.Meter;
import lodebook.assembly.survey.PlacedMagnet;
import lodebook.assembly.survey.SurveyedRing;
import lodebook.db.book.Book;
import lodebook.db.builds.PlaceHow;
import lodebook.db.builds.PlaceRow;
import lodebook.db.builds.Placements;
import lodebook.db.builds.Plans;
import lodebook.db.builds.RecordedPlacement;
import lodebook.db.builds.Rotor;
import lodebook.db.builds.RotorShown;
import lodebook.db.builds.Rotors;
import lodebook.db.meters.MeterKind;
import lodebook.db.meters.Meters;
import lodebook.db.stock.Grades;
import lodebook.db.surveys.FluxUnit;
import lodebook.db.surveys.RecordedReading;
import lodebook.db.surveys.Survey;
import lodebook.db.surveys.SurveyChecks;
import lodebook.db.surveys.SurveyRow;
import lodebook.db.surveys.Surveys;
import lodebook.ui.desk.station.Intake;
import lodebook.ui.desk.station.Station;
import lodebook.ui.files.Rows;
import lodebook.ui.files.SurveyFile;
import org.jspecify.annotations.Nullable;

/// What the room for surveys does to the book; slow enough to be done away from the screen's
/// thread.
final class SurveyBook {
  private final Station station;

  SurveyBook(Station station) {
    this.station = station;
  }

  /// A rotor to choose, with its latest survey.
  ///
  /// @param rotor the rotor
  /// @param survey its latest survey, or null
  record Choice(Rotor rotor, @Nullable Survey survey) {}

  List<Choice> choices() {
    return station.with(
        book -> {
          List<Choice> choices = new ArrayList<>();
          for (Rotor rotor : new Rotors(book).list()) {
            if (rotor.state().equals("open") && rotor.unit() == null && rotor.filled() > 0) {
              String latest = rotor.latestSurvey();
              choices.add(
                  new Choice(rotor, latest == null ? null : new Surveys(book).show(latest)));
            }
          }
          return choices;
        });
  }

  List<lodebook.db.meters.Meter> meters() {
    return station.with(
        book ->
            new Meters(book)
                .list().stream().filter(m -> m.kind() == MeterKind.FIELD && !m.retired()).toList());
  }

  /// The latest round of a rotor, or a survey by its number.
  Round open(String code) {
    return station.with(
        book -> {
          String rotor = code;
          if (code.toUpperCase(java.util.Locale.ROOT).startsWith("S-")) {
            rotor = new Surveys(book).show(code).rotor();
            return read(book, rotor, code);
          }
          return read(book, rotor, new Rotors(book).show(rotor).rotor().latestSurvey());
        });
  }

  /// A round that is about to begin.
  Round fresh(String rotor) {
    return station.with(book -> read(book, rotor, null));
  }

  private static Round read(Book book, String code, @Nullable String number) {
    RotorShown rotor = new Rotors(book).show(code);
    Survey survey = number == null ? null : new Surveys(book).show(number);
    boolean voided = survey != null && survey.voided();
    List<RecordedReading> readings =
        survey == null || voided
            ? List.of()
            : new Surveys(book).asRecorded(List.of(survey.code())).readings();
    return new Round(
        rotor,
        new Surveys(book).list(code),
        voided ? null : survey,
        readings,
        expected(book, rotor),
        null);
  }

  private static List<ExpectedReading> expected(Book book, RotorShown rotor) {
    if (!rotor.rotor().state().equals("open") || rotor.standing().isEmpty()) {
      return List.of();
    }
    BatchTask.Ring ring =
        new Plans(book).stockFor(List.of(rotor.rotor().code()), List.of()).rings().getFirst();
    Map<String, Grade> grades = new HashMap<>();
    new Grades(book).list().forEach(g -> grades.put(g.name(), g));
    Map<Integer, PlacedMagnet> magnets = new HashMap<>();
    ring.kept()
        .forEach(
            k -> {
              Grade grade = grades.get(rotor.design().typeAt(k.slot()).grade());
              magnets.put(
                  k.slot(),
                  new PlacedMagnet(k.strength(), grade == null ? 0 : grade.remanencePerKelvin()));
            });
    return new ExpectedReadings(new SurveyedRing(rotor.design(), magnets), new Meter("", 0.01, 0))
        .all();
  }

  /// Takes one reading of a round in.
  Round reading(Round round, ProbePoint point, double amount, FluxUnit unit, String meter) {
    Survey survey = round.survey();
    return station.with(
        book -> {
          Survey taken =
              new Surveys(book)
                  .importReadings(
                      station.act(),
                      round.code(),
                      List.of(
                          new SurveyRow(
                              point.slot(), point.spot(), point.component(), amount, unit)),
                      meter,
                      survey == null ? null : survey.code());
          return new Round(
              round.rotor(),
              new Surveys(book).list(round.code()),
              taken,
              new Surveys(book).asRecorded(List.of(taken.code())).readings(),
              round.expected(),
              null);
        });
  }

  /// Takes a file of readings in as a survey of its own.
  Round file(Round round, Path file, @Nullable String meter) {
    Intake intake = new Intake(station);
    Rows<SurveyRow> rows = SurveyFile.read(intake.source(file, _ -> {}), meter != null);
    List<Survey> taken = new ArrayList<>();
    intake.take(
        rows,
        () ->
            taken.add(
                station.with(
                    book ->
                        new Surveys(book)
                            .importReadings(
                                station.act(), round.code(), rows.all(), meter, null))));
    return judge(station.with(book -> read(book, round.code(), taken.getFirst().code())));
  }

  /// Explains a round and records what was said.
  Round judge(Round round) {
    Survey survey = round.survey();
    if (survey == null) {
      return round;
    }
    SurveyChecks checks = new SurveyChecks(station::open);
    SurveyChecks.Checked checked = checks.check(List.of(survey.code()));
    if (station.who().get() != null) {
      checks.store(station.act(), checked);
    }
    return round.judged(checked.diagnosis());
  }

  /// Explains a round that was judged before; writes nothing.
  Round explain(Round round) {
    Survey survey = round.survey();
    if (survey == null || round.readings().isEmpty()) {
      return round;
    }
    return round.judged(new SurveyChecks(station::open).check(List.of(survey.code())).diagnosis());
  }

  /// Records that the magnet of a finding was taken out and put right.
  Round reworked(Round round, Finding finding, String why) {
    RecordedPlacement stands =
        round.rotor().standing().stream()
            .filter(p -> p.slot() == finding.slot())
            .findFirst()
            .orElseThrow();
    station.change(
        book ->
            new Placements(book)
                .place(
                    station.act(),
                    round.code(),
                    List.of(
                        new PlaceRow(
                            finding.slot(), stands.magnet(), finding.shouldFace().degrees())),
                    new PlaceHow(PlaceHow.Change.REWORK, false, why)));
    return fresh(round.code());
  }

  /// Declares the round void.
  Round voided(Round round, String why) {
    Survey survey = round.survey();
    if (survey != null) {
      station.change(book -> new Surveys(book).declareVoid(station.act(), survey.code(), why));
    }
    return open(round.code());
  }

  /// Moves the round to the rotor of which it really is.
  Round moved(Round round, String rotor, String why) {
    Survey survey = round.survey();
    if (survey == null) {
      return round;
    }
    station.change(book -> new Surveys(book).move(station.act(), survey.code(), rotor, why));
    return judge(open(survey.code()));
  }
}
