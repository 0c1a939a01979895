package lodebook.ui.paper;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.safety.HandlingFigures;
import lodebook.assembly.survey.Verdict;
import lodebook.db.book.Book;
import lodebook.db.builds.Batches;
import lodebook.db.builds.Plan;
import lodebook.db.builds.PlannedSlot;
import lodebook.db.builds.Plans;
import lodebook.db.builds.RecordedPlacement;
import lodebook.db.builds.Rotor;
import lodebook.db.builds.RotorShown;
import lodebook.db.builds.Rotors;
import lodebook.db.refusal.Refusal;
import lodebook.db.stock.Grades;
import lodebook.db.surveys.Surveys;
import lodebook.reports.traveller.ExpectedReading;
import lodebook.reports.traveller.Step;
import lodebook.reports.traveller.Traveller;
import lodebook.ui.craft.Expectations;
import lodebook.ui.craft.PlannedRing;
import org.jspecify.annotations.Nullable;

/// The traveller of a rotor from what the book holds: its plan in the order of filling, and what
/// stands already.
public final class Travellers {
  private Travellers() {}

  /// What a traveller is made of, read from the book.
  ///
  /// @param shown the rotor with what stands in it
  /// @param ring its plan, or null
  /// @param verdict what the check of its latest survey said, or null
  /// @param grade grade of its magnets
  /// @param gear the gear model of its batch, or null
  /// @param facts what the sheet says about itself
  public record Material(
      RotorShown shown,
      @Nullable PlannedRing ring,
      @Nullable Verdict verdict,
      Grade grade,
      @Nullable String gear,
      Facts facts) {}

  /// Reads what the traveller of a rotor is made of; a plan that cannot be built any more is
  /// refused with the pieces named.
  public static Material read(Book book, String code, Facts facts) {
    RotorShown shown = new Rotors(book).show(code);
    Rotor rotor = shown.rotor();
    PlannedRing ring =
        rotor.planned() ? PlannedRing.of(book, new Plans(book).show(rotor.code())) : null;
    if (ring != null) {
      refuseSpoilt(ring.plan());
    }
    String survey = rotor.latestSurvey();
    String named = shown.design().mainType().grade();
    Grade grade =
        new Grades(book)
            .list().stream().filter(g -> g.name().equals(named)).findFirst().orElseThrow();
    String batch = rotor.batch();
    return new Material(
        shown,
        ring,
        survey == null ? null : new Surveys(book).show(survey).verdict(),
        grade,
        batch == null ? null : gear(book, batch),
        facts);
  }

  private static void refuseSpoilt(Plan plan) {
    List<PlannedSlot> spoilt = plan.spoilt();
    if (!spoilt.isEmpty()) {
      String pieces =
          spoilt.stream()
              .map(s -> "%s (slot %d, %s)".formatted(s.magnet(), s.slot(), s.state()))
              .collect(Collectors.joining(", "));
      throw Refusal.refused("plan.spoilt", plan.rotor(), pieces)
          .remedy("lodebook plan " + plan.rotor() + " " + plan.settings());
    }
  }

  /// The traveller of a rotor; with no plan it says what stands and leaves the rest to the builder.
  ///
  /// @param planned sentences about the plan and the latest survey
  public static Traveller of(Material material, List<String> planned) {
    Rotor rotor = material.shown().rotor();
    RingDesign design = material.shown().design();
    PlannedRing ring = material.ring();
    Expectations expectations = ring == null ? null : ring.expectations();
    return new Traveller(
        material
            .facts()
            .of(rotor.code(), design.layout().code() + " rev " + design.layout().revision()),
        design.layout(),
        design.mainType(),
        design.sideType(),
        rotor.batch(),
        material.gear(),
        steps(material.shown(), ring, expectations),
        ring != null,
        planned,
        expectations == null ? List.of() : finished(expectations, design),
        HandlingFigures.of(design.mainType(), material.grade(), design.slots()));
  }

  private static String gear(Book book, String batch) {
    return new Batches(book).show(batch).gear().replace("@", " rev ");
  }

  private static List<Step> steps(
      RotorShown shown, @Nullable PlannedRing ring, @Nullable Expectations expectations) {
    List<Step> steps = new ArrayList<>();
    for (RecordedPlacement placement : shown.standing()) {
      steps.add(standing(placement));
    }
    if (ring != null && expectations != null) {
      Plan plan = ring.plan();
      plan.slots().stream()
          .filter(s -> !s.state().equals("placed"))
          .sorted(Comparator.comparingInt(PlannedSlot::fillStep))
          .forEach(s -> steps.add(planned(s, expectations)));
    }
    return steps;
  }

  private static Step standing(RecordedPlacement placement) {
    return new Step(
        placement.slot(),
        placement.lot(),
        piece(placement.magnet()),
        null,
        null,
        placement.facing(),
        null,
        List.of(),
        true);
  }

  private static Step planned(PlannedSlot slot, Expectations expectations) {
    return new Step(
        slot.slot(),
        slot.lot(),
        piece(slot.magnet()),
        slot.tray(),
        slot.cell(),
        slot.facing(),
        slot.remark().isEmpty() ? null : slot.remark(),
        readings(expectations.whenPlaced(slot.slot())),
        false);
  }

  /// The piece of a magnet's name, or null for any magnet of its lot.
  private static @Nullable String piece(String magnet) {
    return magnet.contains("/") ? magnet : null;
  }

  private static List<ExpectedReading> finished(Expectations expectations, RingDesign design) {
    List<ExpectedReading> all = new ArrayList<>();
    for (int slot = 1; slot <= design.slots(); slot++) {
      all.addAll(readings(expectations.finished(slot)));
    }
    return all;
  }

  private static List<ExpectedReading> readings(
      List<lodebook.assembly.survey.ExpectedReading> readings) {
    return readings.stream()
        .map(r -> new ExpectedReading(r.point(), r.valueTesla(), r.bandTesla()))
        .toList();
  }
}
