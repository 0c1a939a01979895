package lodebook.db.builds;

import java.time.Instant;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Layout;
import lodebook.db.builds.BenchStock.Lot;
import lodebook.db.builds.BenchStock.Piece;
import lodebook.db.builds.BenchStock.Stand;
import lodebook.db.builds.PlaceHow.Change;
import lodebook.db.builds.Putting.Standing;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.code.Codes;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RowProblem;
import lodebook.db.rights.Person;
import lodebook.db.rights.Role;
import org.jspecify.annotations.Nullable;

/// Looks at each row of a placing against what the book holds.
final class PlaceChecks {
  /// A facing further off the layout than this is a deviation, degrees.
  static final double FACING_TOLERANCE_DEGREES = 5;

  private final Ring ring;
  private final PlaceHow how;
  private final BenchStock stock;
  private final Map<String, Person> people;
  private final Person signer;
  private final Instant statedAt;
  private final Set<Long> freedPlacements = new HashSet<>();
  private final Map<Long, Long> taken = new HashMap<>();
  private final List<RowProblem> problems = new ArrayList<>();

  /// The rotor as it stands before.
  ///
  /// @param id the rotor
  /// @param code its number
  /// @param layout what it is built to
  /// @param standing what stands in each filled slot
  record Ring(long id, String code, Layout layout, Map<Integer, Standing> standing) {}

  PlaceChecks(
      Ring ring,
      PlaceHow how,
      BenchStock stock,
      Map<String, Person> people,
      Person signer,
      Instant statedAt) {
    this.ring = ring;
    this.how = how;
    this.stock = stock;
    this.people = people;
    this.signer = signer;
    this.statedAt = statedAt;
  }

  /// What is wrong with rows in themselves: a slot or a piece twice, a name that is none.
  static List<RowProblem> inThemselves(List<PlaceRow> rows) {
    List<RowProblem> problems = new ArrayList<>();
    Set<Integer> slots = new HashSet<>();
    Set<String> pieces = new HashSet<>();
    for (int i = 0; i < rows.size(); i++) {
      PlaceRow row = rows.get(i);
      if (!slots.add(row.slot())) {
        problems.add(new RowProblem(i, "slot", Refusal.wrongInput("place.slot-twice", row.slot())));
      }
      try {
        MagnetName name = MagnetName.of(row.magnet());
        if (name.number() != null && !pieces.add(CodeText.fold(name.toString()))) {
          problems.add(new RowProblem(i, "piece", Refusal.wrongInput("place.piece-twice", name)));
        }
      } catch (Refusal malformed) {
        problems.add(new RowProblem(i, "piece", malformed));
      }
      if (!Double.isFinite(row.facingDegrees())) {
        problems.add(
            new RowProblem(
                i, "facing_deg", Refusal.wrongInput("place.facing", row.facingDegrees())));
      }
    }
    return problems;
  }

  /// Checks all rows; the puttings count only where [#problems()] is empty.
  List<Putting> check(List<PlaceRow> rows) {
    if (how.change() != Change.NONE) {
      for (PlaceRow row : rows) {
        Standing before = ring.standing().get(row.slot());
        if (before != null) {
          freedPlacements.add(before.placementId());
          taken.merge(before.lotId(), -1L, Long::sum);
        }
      }
    }
    List<Putting> puttings = new ArrayList<>();
    for (int i = 0; i < rows.size(); i++) {
      Putting putting = check(i, rows.get(i));
      if (putting != null) {
        puttings.add(putting);
      }
    }
    return puttings;
  }

  /// What is wrong, row by row.
  List<RowProblem> problems() {
    return List.copyOf(problems);
  }

  private @Nullable Putting check(int index, PlaceRow row) {
    int before = problems.size();
    if (row.slot() < 1 || row.slot() > ring.layout().slots()) {
      problem(
          index,
          "slot",
          Refusal.refused("place.no-slot", ring.code(), row.slot(), ring.layout().slots())
              .remedy("lodebook rotor show " + ring.code()));
      return null;
    }
    Standing standing = ring.standing().get(row.slot());
    if (standing != null) {
      checkFilled(index, row, standing);
    }
    Facing facing = new Facing(row.facingDegrees());
    boolean off = checkFacing(index, row, facing);
    Person person = person(index, row);
    MagnetName name = MagnetName.of(row.magnet());
    Lot lot = lot(index, row, name, standing);
    Piece piece = lot == null || name.number() == null ? null : piece(index, row, lot, name);
    if (problems.size() > before || lot == null || person == null) {
      return null;
    }
    return new Putting(
        row.slot(),
        MagnetName.shown(lot.code(), name.number()),
        lot.id(),
        piece == null ? null : piece.id(),
        facing,
        off,
        person.id(),
        person.initials(),
        row.at() == null ? statedAt : row.at(),
        standing);
  }

  private void checkFilled(int index, PlaceRow row, Standing standing) {
    if (how.change() == Change.NONE) {
      problem(
          index,
          "slot",
          Refusal.refused("place.filled", ring.code(), row.slot(), standing.magnet())
              .remedy("lodebook place " + ring.code() + " placements.csv --rework --why TEXT"));
    } else if (how.change() == Change.CORRECT
        && standing.personId() != signer.id()
        && signer.role() != Role.LEAD) {
      problem(
          index,
          "slot",
          Refusal.refused("place.others-record", ring.code(), row.slot(), standing.by())
              .remedy("lodebook person list"));
    }
  }

  private boolean checkFacing(int index, PlaceRow row, Facing facing) {
    Facing should = ring.layout().ruleFacing(row.slot());
    boolean off = Math.abs(facing.degreesFrom(should)) > FACING_TOLERANCE_DEGREES + 1e-9;
    if (off && !how.deviation()) {
      problem(
          index,
          "facing_deg",
          Refusal.refused(
                  "place.facing-off",
                  ring.code(),
                  row.slot(),
                  degrees(facing),
                  ring.layout().name(),
                  degrees(should))
              .remedy("lodebook place " + ring.code() + " placements.csv --deviation --why TEXT"));
    }
    return off;
  }

  private @Nullable Person person(int index, PlaceRow row) {
    if (row.by() == null) {
      return signer;
    }
    Person person = people.get(CodeText.fold(row.by()));
    if (person == null) {
      problem(
          index, "by", Refusal.refused("person.unknown", row.by()).remedy("lodebook person list"));
    }
    return person;
  }

  private @Nullable Lot lot(int index, PlaceRow row, MagnetName name, @Nullable Standing standing) {
    Lot lot = stock.lot(name);
    if (lot == null) {
      Code other = stock.code(name);
      problem(
          index,
          "piece",
          other == null
              ? Codes.unknown(name.lot(), CodeKind.LOT)
              : Codes.wrongKind(other, CodeKind.LOT));
      return null;
    }
    String type = ring.layout().typeAt(row.slot());
    if (!CodeText.fold(type).equals(CodeText.fold(lot.type()))) {
      problem(
          index,
          "piece",
          Refusal.refused("place.wrong-type", ring.code(), row.slot(), type, lot.code(), lot.type())
              .remedy("lodebook lot list"));
    }
    boolean staysPut = standing != null && standing.lotId() == lot.id() && name.number() == null;
    if (!lot.clear() && !staysPut && !standsHere(lot, name, standing)) {
      problem(index, "piece", notClear(lot));
    }
    if (taken.merge(lot.id(), 1L, Long::sum) == lot.free() + 1) {
      problem(
          index,
          "piece",
          Refusal.refused("place.lot-used-up", lot.code(), lot.free())
              .remedy("lodebook lot show " + lot.code()));
    }
    return lot;
  }

  private boolean standsHere(Lot lot, MagnetName name, @Nullable Standing standing) {
    Piece piece = name.number() == null ? null : stock.piece(lot, name.number());
    return piece != null
        && standing != null
        && standing.pieceId() != null
        && standing.pieceId() == piece.id();
  }

  private static Refusal notClear(Lot lot) {
    return switch (lot.state()) {
      case "awaiting" ->
          Refusal.refused("place.lot-awaiting", lot.code())
              .remedy("lodebook lot accept " + lot.code() + " --why TEXT");
      case "held" ->
          Refusal.refused("place.lot-held", lot.code())
              .remedy("lodebook lot free " + lot.code() + " --why TEXT");
      default ->
          Refusal.refused("place.lot-rejected", lot.code())
              .remedy("lodebook lot show " + lot.code());
    };
  }

  private @Nullable Piece piece(int index, PlaceRow row, Lot lot, MagnetName name) {
    long number = java.util.Objects.requireNonNull(name.number());
    String shown = MagnetName.shown(lot.code(), number);
    Piece piece = stock.piece(lot, number);
    if (piece == null) {
      problem(
          index,
          "piece",
          Refusal.refused("place.no-piece", shown, lot.code())
              .remedy("lodebook piece list " + lot.code()));
      return null;
    }
    Stand stand = piece.standsIn();
    boolean here = stand != null && stand.rotorId() == ring.id() && stand.slot() == row.slot();
    if (!piece.state().equals("usable") && !here) {
      problem(
          index,
          "piece",
          Refusal.refused("place.piece-" + piece.state(), shown)
              .remedy("lodebook piece show " + shown));
    }
    if (stand != null && !freedPlacements.contains(stand.placementId()) && !here) {
      problem(
          index,
          "piece",
          Refusal.refused("place.piece-placed", shown, stand.rotor(), stand.slot())
              .remedy("lodebook rotor show " + stand.rotor()));
    }
    String keptFor = piece.keptFor();
    if (keptFor != null && piece.keptForId() != null && piece.keptForId() != ring.id()) {
      problem(
          index,
          "piece",
          Refusal.refused("place.piece-kept", shown, keptFor)
              .remedy("lodebook plan " + keptFor + " --drop"));
    }
    return piece;
  }

  private void problem(int index, String column, Refusal refusal) {
    problems.add(new RowProblem(index, column, refusal));
  }

  private static String degrees(Facing facing) {
    String text = String.format(Locale.ROOT, "%.1f", facing.degrees());
    return text.endsWith(".0") ? text.substring(0, text.length() - 2) : text;
  }
}
