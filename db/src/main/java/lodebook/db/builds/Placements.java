package lodebook.db.builds;

import static lodebook.db.tables.Tables.PERSON;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.Layout;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.builds.PlaceHow.Change;
import lodebook.db.builds.Putting.Standing;
import lodebook.db.code.CodeText;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RowsRefused;
import lodebook.db.rights.Permission;
import lodebook.db.rights.Person;
import lodebook.db.rights.Role;
import lodebook.db.tables.tables.records.RotorRecord;
import org.jooq.DSLContext;

/// Recording which magnet was really put where.
public final class Placements {
  private final Book book;

  /// Placements of an open book.
  public Placements(Book book) {
    this.book = book;
  }

  /// Records rows for a rotor, all of them or none; a refusal lists every row at fault by its index
  /// ([RowsRefused]).
  ///
  /// A facing more than 5° off the layout is refused unless it is meant as a deviation. A filled
  /// slot is refused unless the rows correct the record or tell of a rework; what stood there
  /// before stays on record, superseded. A plan isn't needed.
  public Placed place(Act act, String rotor, List<PlaceRow> rows, PlaceHow how) {
    if (how.why().isBlank() && (how.deviation() || how.change() != Change.NONE)) {
      throw Refusal.wrongInput("place.why-missing", rotor).remedy("lodebook help place");
    }
    RowsRefused.throwIfAny(PlaceChecks.inThemselves(rows));
    return book.write(
        act, Permission.ANYTHING_ELSE, "place", writing -> placeIn(writing, rotor, rows, how));
  }

  private static Placed placeIn(Writing writing, String code, List<PlaceRow> rows, PlaceHow how) {
    if (how.deviation()) {
      writing.require(Permission.LEAD, "place --deviation");
    }
    DSLContext sql = writing.sql();
    RotorRecord row = Rotors.require(sql, code);
    Rotor rotor = Rotors.byId(sql, row.getId());
    Rotors.requireOpen(rotor);
    Layout layout = Rotors.design(sql, row).layout();
    Map<Integer, Standing> standing = SlotWriter.standing(sql, row.getId());
    PlaceChecks checks =
        new PlaceChecks(
            new PlaceChecks.Ring(row.getId(), rotor.code(), layout, standing),
            how,
            new BenchStock(sql, rows.stream().map(each -> MagnetName.of(each.magnet())).toList()),
            people(sql),
            writing.person(),
            writing.statedAt());
    List<Putting> puttings = checks.check(rows);
    RowsRefused.throwIfAny(checks.problems());
    List<String> takenOut = write(writing, row.getId(), rotor.code(), puttings, how);
    int filled = SlotWriter.standing(sql, row.getId()).size();
    if (filled == layout.slots()) {
      LivePlans.drop(writing, row.getId(), rotor.code());
    }
    List<Integer> slots = puttings.stream().map(Putting::slot).sorted().toList();
    return new Placed(rotor.code(), slots, filled, layout.slots(), takenOut);
  }

  private static List<String> write(
      Writing writing, long rotorId, String rotor, List<Putting> puttings, PlaceHow how) {
    writing
        .line()
        .subject(rotor)
        .field("rotor", rotor)
        .field("change", how.change())
        .field("why", how.why().isBlank() ? null : how.why());
    Map<Long, String> out = new LinkedHashMap<>();
    for (Putting putting : puttings) {
      Standing before = putting.replaces();
      if (before != null) {
        SlotWriter.clear(writing, before);
        if (before.pieceId() != null) {
          out.put(before.pieceId(), before.magnet());
          writing.line().subject(before.magnet());
        }
      }
    }
    String kind = how.change() == Change.CORRECT ? "corrected" : "reworked";
    for (Putting putting : puttings) {
      boolean changed = putting.replaces() != null;
      long id =
          SlotWriter.put(
              writing, rotorId, rotor, putting, changed || putting.deviation() ? how.why() : "");
      if (putting.replaces() != null) {
        SlotWriter.end(writing, putting.replaces(), kind, id, how.why());
      }
      out.remove(putting.pieceId());
      writing
          .line()
          .row(
              List.of(
                  Integer.toString(putting.slot()),
                  putting.magnet(),
                  Double.toString(putting.facing().degrees()),
                  putting.deviation() ? "deviation" : "",
                  putting.at().toString(),
                  putting.by()));
    }
    return new ArrayList<>(out.values());
  }

  private static Map<String, Person> people(DSLContext sql) {
    Map<String, Person> people = new HashMap<>();
    sql.selectFrom(PERSON)
        .forEach(
            row ->
                people.put(
                    CodeText.fold(row.getInitials()),
                    new Person(
                        row.getId(),
                        row.getInitials(),
                        row.getName(),
                        Role.of(row.getRole()),
                        row.getRetired())));
    return people;
  }
}
