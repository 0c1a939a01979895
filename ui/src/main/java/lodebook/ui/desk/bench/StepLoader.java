package lodebook.ui.desk.bench;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.Strength;
import lodebook.assembly.plan.BatchTask;
import lodebook.assembly.survey.ExpectedReading;
import lodebook.assembly.survey.ExpectedReadings;
import lodebook.assembly.survey.Meter;
import lodebook.assembly.survey.PlacedMagnet;
import lodebook.assembly.survey.SurveyedRing;
import lodebook.db.book.Book;
import lodebook.db.builds.Plan;
import lodebook.db.builds.PlannedSlot;
import lodebook.db.builds.Plans;
import lodebook.db.builds.RecordedPlacement;
import lodebook.db.builds.RotorShown;
import lodebook.db.builds.Rotors;
import lodebook.db.stock.Grades;
import lodebook.db.stock.Lot;
import lodebook.db.stock.LotState;
import lodebook.db.stock.Lots;
import lodebook.db.surveys.RecordedReading;
import lodebook.db.surveys.Survey;
import lodebook.db.surveys.Surveys;
import lodebook.ui.desk.station.Station;
import org.jspecify.annotations.Nullable;

/// Finds the step at which a rotor stands, from the book alone: so it is found again after the
/// power was gone.
final class StepLoader {
  private static final Meter USUAL = new Meter("", 0.01, 0);

  private final Station station;

  StepLoader(Station station) {
    this.station = station;
  }

  private record Found(
      RotorShown rotor,
      @Nullable Plan plan,
      List<Grade> grades,
      Map<Integer, Strength> strengths,
      @Nullable String survey,
      List<RecordedReading> readings) {}

  /// Where a rotor stands.
  ///
  /// @param askMissing whether readings that are missing from the last magnet are asked for first
  BenchLoad load(String rotor, boolean askMissing) {
    Found found = station.with(book -> read(book, rotor));
    PlannedSlot next = null;
    if (found.plan != null) {
      List<PlannedSlot> spoilt = found.plan.spoilt();
      if (!spoilt.isEmpty()) {
        return new BenchLoad.Spoilt(
            found.rotor,
            found.plan.slots().stream().map(PlannedSlot::lot).distinct().toList(),
            spoilt.stream().map(PlannedSlot::slot).toList());
      }
      next =
          found.plan.slots().stream()
              .filter(s -> s.state().equals("planned"))
              .min(Comparator.comparingInt(PlannedSlot::fillStep))
              .orElse(null);
    }
    BenchStep unread = askMissing ? unread(found) : null;
    if (unread != null) {
      return new BenchLoad.Ready(unread);
    }
    if (next != null) {
      return new BenchLoad.Ready(step(found, next));
    }
    return found.rotor.rotor().filled() == found.rotor.rotor().slots()
        ? new BenchLoad.Full(found.rotor)
        : new BenchLoad.Unplanned(found.rotor, lotsFor(found.rotor));
  }

  /// Accepted lots of a rotor's magnet types that have pieces left.
  private List<String> lotsFor(RotorShown rotor) {
    Set<String> types = new HashSet<>();
    for (int slot = 1; slot <= rotor.design().slots(); slot++) {
      types.add(rotor.design().typeAt(slot).code());
    }
    return station.with(
        book ->
            new Lots(book)
                .list().stream()
                    .filter(l -> l.state() == LotState.ACCEPTED && l.left() > 0)
                    .filter(l -> types.contains(l.received().type()))
                    .map(Lot::code)
                    .toList());
  }

  private static Found read(Book book, String code) {
    RotorShown rotor = new Rotors(book).show(code);
    Plan plan = rotor.rotor().planned() ? new Plans(book).show(code) : null;
    Map<Integer, Strength> strengths = new HashMap<>();
    BatchTask.Ring ring =
        new Plans(book).stockFor(List.of(rotor.rotor().code()), List.of()).rings().getFirst();
    ring.kept().forEach(k -> strengths.put(k.slot(), k.strength()));
    Survey latest = null;
    List<RecordedReading> readings = List.of();
    String number = rotor.rotor().latestSurvey();
    if (number != null) {
      latest = new Surveys(book).show(number);
      if (!latest.voided()) {
        readings = new Surveys(book).asRecorded(List.of(number)).readings();
      }
    }
    return new Found(
        rotor,
        plan,
        new Grades(book).list(),
        strengths,
        latest == null || latest.voided() ? null : latest.code(),
        readings);
  }

  /// The magnet that was put in last, if some of its readings are missing.
  private @Nullable BenchStep unread(Found found) {
    RecordedPlacement last =
        found.rotor.standing().stream()
            .max(Comparator.comparingLong(RecordedPlacement::sequence))
            .orElse(null);
    if (last == null || found.plan == null) {
      return null;
    }
    Set<ProbePoint> read = new HashSet<>();
    for (RecordedReading reading : found.readings) {
      if (reading.sequence() > last.sequence()) {
        read.add(reading.reading().point());
      }
    }
    List<ProbePoint> missing = new ArrayList<>(points(found.rotor.design().layout(), last.slot()));
    missing.removeAll(read);
    if (missing.isEmpty()) {
      return null;
    }
    Map<Integer, PlacedMagnet> standing = standing(found);
    return new BenchStep(
        found.rotor,
        last.slot(),
        found.rotor.rotor().filled(),
        found.rotor.rotor().slots(),
        last.magnet(),
        last.lot(),
        null,
        null,
        last.facing(),
        "",
        true,
        missing,
        expected(found, standing, missing),
        found.survey,
        standing,
        false);
  }

  private static BenchStep step(Found found, PlannedSlot next) {
    Map<Integer, PlacedMagnet> standing = standing(found);
    standing.put(next.slot(), magnet(found, next.slot(), next.strength()));
    List<ProbePoint> points = points(found.rotor.design().layout(), next.slot());
    return new BenchStep(
        found.rotor,
        next.slot(),
        found.rotor.rotor().filled() + 1,
        found.rotor.rotor().slots(),
        next.magnet(),
        next.lot(),
        next.tray(),
        next.cell(),
        next.facing(),
        next.remark(),
        false,
        points,
        expected(found, standing, points),
        found.survey,
        standing,
        false);
  }

  private static Map<Integer, PlacedMagnet> standing(Found found) {
    Map<Integer, PlacedMagnet> standing = new HashMap<>();
    found.strengths.forEach((slot, s) -> standing.put(slot, magnet(found, slot, s)));
    return standing;
  }

  private static PlacedMagnet magnet(Found found, int slot, Strength strength) {
    String grade = found.rotor.design().typeAt(slot).grade();
    double perKelvin =
        found.grades.stream()
            .filter(g -> g.name().equals(grade))
            .mapToDouble(Grade::remanencePerKelvin)
            .findFirst()
            .orElse(0);
    return new PlacedMagnet(strength, perKelvin);
  }

  /// The readings that a layout asks for at a slot, in its order.
  static List<ProbePoint> points(Layout layout, int slot) {
    List<ProbePoint> points = new ArrayList<>();
    for (Spot spot : layout.probe().spots()) {
      for (Component component : layout.probe().components()) {
        points.add(new ProbePoint(slot, spot, component));
      }
    }
    return points;
  }

  private static List<ExpectedReading> expected(
      Found found, Map<Integer, PlacedMagnet> standing, List<ProbePoint> points) {
    return new ExpectedReadings(new SurveyedRing(found.rotor.design(), standing), USUAL).at(points);
  }

  /// What some points should read with a step's magnet in.
  static List<ExpectedReading> expected(BenchStep step, List<ProbePoint> points) {
    return new ExpectedReadings(new SurveyedRing(step.design(), step.standing()), USUAL).at(points);
  }
}
