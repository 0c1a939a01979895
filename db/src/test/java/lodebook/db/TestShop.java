package lodebook.db;

import java.time.LocalDate;
import java.util.List;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.meters.Meter;
import lodebook.db.meters.MeterKind;
import lodebook.db.meters.Meters;
import lodebook.db.people.People;
import lodebook.db.rights.Role;
import lodebook.db.stock.LotDecisions;
import lodebook.db.stock.LotImport;
import lodebook.db.stock.MagnetTypes;
import lodebook.db.stock.NewLot;

/// A small shop to test in.
public final class TestShop {
  /// The type of the shop's magnets.
  public static final MagnetType BLOCK =
      new MagnetType(
          "BLK-4-4-10", Shape.BLOCK, 4e-3, 4e-3, 10e-3, 0, 0, 0, "N42", 0.05e-3, "nickel", 1.05, 0);

  /// The lead, signing now.
  public static final Act LEAD = Act.by("LE");

  /// Somebody at the bench, signing now.
  public static final Act BENCH = Act.by("BE");

  private TestShop() {}

  /// A lot of the shop's magnets as it is received.
  public static NewLot lot(String number, int count) {
    return new NewLot(
        number,
        "BLK-4-4-10",
        "Magnet Works",
        "MW-77",
        LocalDate.parse("2026-05-04"),
        count,
        "C-1",
        1.30,
        "shelf 3");
  }

  static void open(BookAddress place) {
    try (Book book = Book.open(place, TestBook.visit(TestBook.START.plusSeconds(60)))) {
      People people = new People(book);
      people.add(Act.by(null), "LE", "Lena Lead", Role.LEAD);
      people.add(LEAD, "IN", "Ines Inspector", Role.INSPECTOR);
      people.add(LEAD, "PL", "Pia Planner", Role.PLANNER);
      people.add(LEAD, "BE", "Ben Bench", Role.BENCH);
      new Meters(book)
          .add(
              LEAD,
              new Meter(
                  "GM-1",
                  MeterKind.FIELD,
                  0.01,
                  1e-4,
                  0.5e-3,
                  LocalDate.parse("2027-05-04"),
                  false));
      new MagnetTypes(book).importTypes(LEAD, List.of(BLOCK));
      new LotImport(book).importLots(LEAD, List.of(lot("L-1", 60)));
      new LotDecisions(book).accept(LEAD, "L-1", "certificate read");
    }
  }
}
