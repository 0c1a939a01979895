package lodebook.ui.desk.bench;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.plan.MixPolicy;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.ExpectedReading;
import lodebook.assembly.survey.Priors;
import lodebook.assembly.survey.ProbeResponses;
import lodebook.assembly.survey.Reading;
import lodebook.assembly.survey.SurveyExplainer;
import lodebook.assembly.survey.Verdict;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.builds.PlaceHow;
import lodebook.db.builds.PlaceRow;
import lodebook.db.builds.Placements;
import lodebook.db.builds.Plans;
import lodebook.db.builds.Rotor;
import lodebook.db.builds.Rotors;
import lodebook.db.meters.Meter;
import lodebook.db.meters.MeterKind;
import lodebook.db.meters.Meters;
import lodebook.db.people.People;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Person;
import lodebook.db.stock.PieceDecisions;
import lodebook.db.stock.PieceName;
import lodebook.db.stock.Trays;
import lodebook.db.surveys.FluxUnit;
import lodebook.db.surveys.RecordedSurvey;
import lodebook.db.surveys.Survey;
import lodebook.db.surveys.SurveyChecks;
import lodebook.db.surveys.SurveyRow;
import lodebook.db.surveys.Surveys;
import lodebook.ui.craft.BuiltVersion;
import lodebook.ui.craft.FillWords;
import lodebook.ui.craft.PlanWish;
import lodebook.ui.craft.Planning;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// What the bench does to the book; slow enough to be done away from the screen's thread.
final class BenchBook {

  /// A reading further off than three standard deviations is looked into; a band is two of them.
  private static final double DOUBTFUL_BANDS = 1.5;

  private final Station station;
  private final StepLoader loader;
  private @Nullable ProbeResponses responses;
  private String responsesOf = "";

  BenchBook(Station station) {
    this.station = station;
    this.loader = new StepLoader(station);
  }

  /// What there is to sit down at.
  ///
  /// @param rotors open rotors that are not full, planned ones first
  /// @param meters meters of flux density in use
  /// @param people who may sign
  record Offer(List<Rotor> rotors, List<Meter> meters, List<Person> people) {}

  Offer offer() {
    return station.with(
        book -> {
          List<Rotor> rotors = new ArrayList<>();
          for (boolean planned : new boolean[] {true, false}) {
            for (Rotor rotor : new Rotors(book).list()) {
              boolean open = rotor.state().equals("open") && rotor.unit() == null;
              if (open && rotor.filled() < rotor.slots() && rotor.planned() == planned) {
                rotors.add(rotor);
              }
            }
          }
          List<Meter> meters =
              new Meters(book)
                  .list().stream()
                      .filter(m -> m.kind() == MeterKind.FIELD && !m.retired())
                      .toList();
          List<Person> people = new People(book).list().stream().filter(p -> !p.retired()).toList();
          return new Offer(rotors, meters, people);
        });
  }

  /// Where a rotor stands, readings that are missing from its last magnet first.
  BenchLoad load(String rotor) {
    return loader.load(rotor, true);
  }

  /// The next step, when everything at the last one was said.
  BenchLoad next(String rotor) {
    return loader.load(rotor, false);
  }

  /// Records that the magnet is in, unless it was, and the first of the readings to be taken; then
  /// judges what stands.
  Outcome confirm(BenchStep step, double amount, FluxUnit unit, String meter) {
    Act act = station.act();
    ProbePoint point = step.toRead().getFirst();
    RecordedSurvey recorded;
    String survey;
    try (Book book = station.open()) {
      if (!step.placed()) {
        place(book, act, step, step.magnet(), PlaceHow.PLAIN);
      }
      Survey taken =
          new Surveys(book)
              .importReadings(
                  act,
                  step.code(),
                  List.of(
                      new SurveyRow(point.slot(), point.spot(), point.component(), amount, unit)),
                  meter,
                  step.survey());
      survey = taken.code();
      recorded = new Surveys(book).asRecorded(List.of(survey));
    }
    return judge(step, unit.tesla(amount), recorded, survey);
  }

  private Outcome judge(BenchStep step, double tesla, RecordedSurvey recorded, String survey) {
    ExpectedReading expected = step.expected().getFirst();
    double doubtful = DOUBTFUL_BANDS * expected.bandTesla();
    boolean near = Math.abs(tesla - expected.valueTesla()) <= doubtful;
    boolean tells = near && Math.abs(expected.valueTesla()) > 2 * doubtful;
    BenchStep after = step.afterReading(survey, tells);
    if (near && (after.told() || !after.toRead().isEmpty())) {
      return new Outcome(Outcome.Kind.RIGHT, after, null);
    }
    Diagnosis diagnosis = explain(recorded);
    if (diagnosis.verdict() == Verdict.FAULT) {
      return new Outcome(Outcome.Kind.FAULT, after, diagnosis);
    }
    boolean told = diagnosis.findings().isEmpty() && near;
    return new Outcome(
        told ? Outcome.Kind.CANNOT_TELL : Outcome.Kind.UNEXPLAINED, after, diagnosis);
  }

  /// What the readings at the ring's present state show; of several at one place the last counts.
  private Diagnosis explain(RecordedSurvey recorded) {
    ProbeResponses kept = responses;
    String design = recorded.design().layout().name();
    if (kept == null || !responsesOf.equals(design)) {
      kept = new ProbeResponses(recorded.design());
      responses = kept;
      responsesOf = design;
    }
    RecordedSurvey.Stage stage = recorded.stages().getLast();
    Map<ProbePoint, Reading> last = new LinkedHashMap<>();
    stage.readings().forEach(r -> last.put(r.point(), r));
    return new SurveyExplainer(stage.ring(), Priors.DEFAULT, kept)
        .explain(List.copyOf(last.values()));
  }

  private static void place(Book book, Act act, BenchStep step, String magnet, PlaceHow how) {
    new Placements(book)
        .place(
            act,
            step.code(),
            List.of(new PlaceRow(step.slot(), magnet, step.facing().degrees())),
            how);
  }

  /// Records that the magnet in the slot was taken out and put in the right way round.
  BenchLoad turned(BenchStep step, String why) {
    station.change(
        book ->
            place(
                book,
                station.act(),
                step,
                step.magnet(),
                new PlaceHow(PlaceHow.Change.REWORK, false, why)));
    return again(step);
  }

  private static BenchLoad again(BenchStep step) {
    List<ProbePoint> points = StepLoader.points(step.design().layout(), step.slot());
    return new BenchLoad.Ready(step.readAgain(points, StepLoader.expected(step, points)));
  }

  /// The same step, to be read once more.
  BenchLoad readAgain(BenchStep step) {
    return again(step);
  }

  /// Leaves the mark of a fault in the book and goes on.
  BenchLoad goOn(BenchStep step, @Nullable Diagnosis diagnosis) {
    String survey = step.survey();
    if (diagnosis != null && survey != null) {
      RecordedSurvey recorded = station.with(book -> new Surveys(book).asRecorded(List.of(survey)));
      new SurveyChecks(station::open)
          .store(station.act(), new SurveyChecks.Checked(recorded, diagnosis));
    }
    return loader.load(step.code(), false);
  }

  /// The magnet is in, but nothing is read there.
  BenchLoad unread(BenchStep step) {
    if (!step.placed()) {
      station.change(book -> place(book, station.act(), step, step.magnet(), PlaceHow.PLAIN));
    }
    return loader.load(step.code(), false);
  }

  /// Scraps the step's piece and plans the empty slots anew.
  BenchLoad broken(BenchStep step, String why) {
    if (step.magnet().contains("/")) {
      station.change(
          book -> new PieceDecisions(book).scrap(station.act(), PieceName.of(step.magnet()), why));
    }
    return planAnew(step.code(), lots(step));
  }

  /// Records that another piece was used: one of a tray's cell, or `LOT/NUMBER`.
  BenchLoad usedAnother(BenchStep step, String where, String why) {
    String magnet = station.with(book -> named(book, where));
    List<String> lots = lots(step);
    station.change(
        book ->
            place(
                book,
                station.act(),
                step,
                magnet,
                step.placed()
                    ? new PlaceHow(PlaceHow.Change.CORRECT, false, why)
                    : PlaceHow.PLAIN));
    BenchLoad load = loader.load(step.code(), true);
    return load instanceof BenchLoad.Spoilt ? planAnew(step.code(), lots) : load;
  }

  private static String named(Book book, String where) {
    if (where.contains("/")) {
      return PieceName.of(where).toString();
    }
    String[] parts = where.strip().split("\\s+", 2);
    if (parts.length == 2) {
      for (Trays.Content content : new Trays(book).show(parts[0])) {
        if (content.cell().equalsIgnoreCase(parts[1])) {
          return content.piece().toString();
        }
      }
    }
    throw Refusal.wrongInput("piece.malformed", where);
  }

  private List<String> lots(BenchStep step) {
    return station.with(
        book -> {
          Set<String> lots = new LinkedHashSet<>(Set.of(step.lot()));
          if (new Rotors(book).show(step.code()).rotor().planned()) {
            new Plans(book).show(step.code()).slots().forEach(s -> lots.add(s.lot()));
          }
          return List.copyOf(lots);
        });
  }

  /// Plans the empty slots of a rotor anew from some lots.
  BenchLoad planAnew(String rotor, List<String> lots) {
    DeskWords words = station.words();
    FillWords remarks = new FillWords(words::say, force -> words.number(force, 1));
    PlanWish wish =
        new PlanWish(List.of(rotor), lots, MixPolicy.FEW, List.of(), Map.of(), Set.of(), 1, null);
    new Planning(station::open, remarks, BuiltVersion.text(), _ -> {}).plan(station.act(), wish);
    return load(rotor);
  }
}
