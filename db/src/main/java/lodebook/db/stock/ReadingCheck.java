package lodebook.db.stock;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.code.Codes;
import lodebook.db.meters.Meter;
import lodebook.db.meters.MeterKind;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RowProblem;
import lodebook.db.refusal.RowsRefused;
import lodebook.db.stock.LotStock.Cell;
import lodebook.db.stock.LotStock.KnownPiece;
import org.jspecify.annotations.Nullable;

/// Checks all rows of readings against the book and against each other.
final class ReadingCheck {
  private static final int LONGEST_CELL = 20;

  private final LotStock stock;
  private final boolean again;
  private final List<RowProblem> problems = new ArrayList<>();
  private final Map<Long, Cell> cellOfPiece = new HashMap<>();
  private final Map<Cell, Long> pieceOfCell = new HashMap<>();
  private final Map<String, Integer> firstRow = new HashMap<>();
  private final Set<Long> newNumbers = new HashSet<>();

  private ReadingCheck(LotStock stock, boolean again) {
    this.stock = stock;
    this.again = again;
  }

  /// Refuses the rows if one of them is at fault.
  static void refuseFaults(LotStock stock, List<ReadingRow> rows, boolean again) {
    ReadingCheck check = new ReadingCheck(stock, again);
    int repeated = 0;
    for (int row = 0; row < rows.size(); row++) {
      check.row(row, rows.get(row));
      repeated += check.isInBook(rows.get(row)) ? 1 : 0;
    }
    if (!again && repeated == rows.size() && repeated > 0) {
      throw Refusal.refused("reading.file-again", stock.code().shown(), repeated)
          .remedy("lodebook piece import " + stock.code().shown() + " FILE --again --why TEXT");
    }
    RowsRefused.throwIfAny(check.problems);
  }

  private void row(int index, ReadingRow row) {
    checkNumbers(index, row);
    checkPiece(index, row);
    checkCell(index, row);
    checkMeter(index, row.meter());
    String by = row.by();
    if (by != null && !stock.people().containsKey(CodeText.fold(by))) {
      problem(index, "by", Refusal.refused("person.unknown", by).remedy("lodebook person list"));
    }
    if (!again) {
      checkRepeated(index, row);
    }
  }

  private void checkNumbers(int index, ReadingRow row) {
    if (row.number() < 1) {
      problem(index, "piece", Refusal.wrongInput("piece.number", row.number()));
    }
    if (!(row.fluxTesla() > 0)) {
      problem(index, "value", Refusal.wrongInput("reading.negative", name(row)));
    }
    if (!(row.standoffMetres() >= 0)) {
      problem(index, "standoff_mm", Refusal.wrongInput("reading.standoff", name(row)));
    }
  }

  private void checkPiece(int index, ReadingRow row) {
    KnownPiece known = stock.pieces().get(row.number());
    if (known == null) {
      checkCount(index, row);
      return;
    }
    if (known.state() == PieceState.SCRAPPED) {
      problem(
          index,
          "piece",
          Refusal.refused("piece.scrapped", name(row)).remedy("lodebook piece show " + name(row)));
    }
    if (!known.stands().isEmpty()) {
      problem(
          index,
          "piece",
          Refusal.refused("piece.stands", name(row), known.stands())
              .remedy("lodebook piece show " + name(row)));
    }
  }

  private void checkCount(int index, ReadingRow row) {
    long count = stock.lot().getPieceCount();
    if (newNumbers.add(row.number()) && stock.pieces().size() + newNumbers.size() > count) {
      String lot = stock.code().shown();
      int needed = stock.pieces().size() + newNumbers.size();
      problem(
          index,
          "piece",
          Refusal.refused("lot.too-many-pieces", name(row), lot, count)
              .remedy("lodebook lot count %s %d --why TEXT".formatted(lot, needed)));
    }
  }

  private void checkCell(int index, ReadingRow row) {
    String tray = row.tray();
    String cell = row.cell();
    if (tray == null || cell == null) {
      if (tray != null || cell != null) {
        problem(index, tray == null ? "tray" : "cell", Refusal.wrongInput("cell.half", name(row)));
      }
      return;
    }
    if (cell.isBlank() || cell.length() > LONGEST_CELL) {
      problem(index, "cell", Refusal.wrongInput("cell.malformed", cell, LONGEST_CELL));
      return;
    }
    Code code = stock.trays().get(CodeText.fold(tray));
    if (code == null && !CodeText.isCode(tray)) {
      problem(index, "tray", Refusal.wrongInput("code.malformed", tray, CodeText.LONGEST));
      return;
    }
    if (code != null && code.kind() != CodeKind.TRAY) {
      problem(index, "tray", Codes.taken(code));
      return;
    }
    checkPlace(index, row, Cell.of(tray, cell), tray + " " + cell.strip());
  }

  private void checkPlace(int index, ReadingRow row, Cell cell, String shown) {
    KnownPiece known = stock.pieces().get(row.number());
    PieceName holder = stock.inCells().get(cell);
    boolean liesThere =
        holder != null
            && CodeText.fold(holder.lot()).equals(CodeText.fold(stock.code().shown()))
            && holder.number() == row.number();
    if (holder != null && !liesThere) {
      problem(
          index,
          "cell",
          Refusal.refused("cell.taken", shown, holder).remedy("lodebook tray show " + row.tray()));
    } else if (known != null && !known.lies().isEmpty() && !liesThere) {
      problem(
          index,
          "cell",
          Refusal.refused("piece.lies", name(row), known.lies(), shown)
              .remedy("lodebook tray move moves.csv"));
    }
    Cell earlier = cellOfPiece.putIfAbsent(row.number(), cell);
    if (earlier != null && !earlier.equals(cell)) {
      problem(index, "cell", Refusal.wrongInput("piece.two-cells", name(row)));
    }
    Long other = pieceOfCell.putIfAbsent(cell, row.number());
    if (other != null && other != row.number()) {
      problem(
          index,
          "cell",
          Refusal.wrongInput(
              "cell.two-pieces", shown, new PieceName(stock.code().shown(), other), name(row)));
    }
  }

  private void checkMeter(int index, @Nullable String code) {
    if (code == null) {
      return;
    }
    Meter meter = stock.meters().get(CodeText.fold(code));
    if (meter == null) {
      problem(index, "meter", Codes.unknown(code, CodeKind.METER));
    } else if (meter.kind() != MeterKind.FIELD) {
      problem(
          index,
          "meter",
          Refusal.refused("meter.not-field", meter.code(), meter.kind().word())
              .remedy("lodebook meter list"));
    } else if (meter.retired()) {
      problem(
          index,
          "meter",
          Refusal.refused("meter.retired", meter.code()).remedy("lodebook meter list"));
    }
  }

  private void checkRepeated(int index, ReadingRow row) {
    Integer earlier = firstRow.putIfAbsent(row.canonical(), index);
    if (earlier != null) {
      problem(index, "piece", Refusal.wrongInput("reading.twice", name(row), earlier + 1));
    } else if (isInBook(row)) {
      problem(
          index,
          "piece",
          Refusal.refused("reading.again", name(row))
              .remedy(
                  "lodebook piece import " + stock.code().shown() + " FILE --again --why TEXT"));
    }
  }

  private boolean isInBook(ReadingRow row) {
    KnownPiece known = stock.pieces().get(row.number());
    return known != null
        && stock.repeats().containsKey(LotStock.repeatOf(known.id(), Fingerprint.of(row)));
  }

  private PieceName name(ReadingRow row) {
    return new PieceName(stock.code().shown(), row.number());
  }

  private void problem(int row, String column, Refusal refusal) {
    problems.add(new RowProblem(row, column, Objects.requireNonNull(refusal)));
  }
}
