package lodebook.ui.craft;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.Strength;
import lodebook.assembly.plan.BatchTask;
import lodebook.db.book.Book;
import lodebook.db.builds.Plan;
import lodebook.db.builds.Plans;
import lodebook.db.stock.Grades;

/// A plan with the ring it is for, read from the book; what it will read is computed later, with
/// the book closed.
///
/// @param plan the plan that counts
/// @param design the ring
/// @param grades the grades that the book knows
/// @param standing strengths of what stands already, by slot
public record PlannedRing(
    Plan plan, RingDesign design, List<Grade> grades, Map<Integer, Strength> standing) {
  public PlannedRing {
    grades = List.copyOf(grades);
    standing = Map.copyOf(standing);
  }

  /// The plan of an open rotor with what its readings depend on.
  public static PlannedRing of(Book book, Plan plan) {
    BatchTask.Ring ring =
        new Plans(book).stockFor(List.of(plan.rotor()), List.of()).rings().getFirst();
    Map<Integer, Strength> standing = new HashMap<>();
    ring.kept().forEach(k -> standing.put(k.slot(), k.strength()));
    return new PlannedRing(plan, ring.design(), new Grades(book).list(), standing);
  }

  /// What the ring will read; takes its time.
  public Expectations expectations() {
    return new Expectations(design, grades, standing, plan.slots());
  }
}
