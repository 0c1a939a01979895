package lodebook.db.stock;

import static lodebook.db.tables.Tables.CELL_CONTENT;
import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LIVE_PLACEMENT;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.TRAY;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.code.Codes;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RowProblem;
import lodebook.db.refusal.RowsRefused;
import lodebook.db.rights.Permission;
import lodebook.db.stock.LotStock.Cell;
import lodebook.db.tables.tables.records.PieceRecord;
import org.jooq.DSLContext;

/// Laying pieces into other cells. All moves of one call happen at once, so two pieces can change
/// places.
public final class TrayMoves {
  private final Book book;

  /// Moving pieces in a book.
  public TrayMoves(Book book) {
    this.book = book;
  }

  /// Moves pieces, all or none.
  public void move(Act act, List<CellMove> moves) {
    book.run(act, Permission.ANYTHING_ELSE, "tray move", writing -> move(writing, moves));
  }

  private static void move(Writing writing, List<CellMove> moves) {
    DSLContext sql = writing.sql();
    List<RowProblem> problems = new ArrayList<>();
    Map<Integer, Long> pieces = pieces(sql, moves, problems);
    Map<String, Code> trays = Codes.findAll(sql, moves.stream().map(CellMove::tray).toList());
    checkCells(sql, moves, pieces, trays, problems);
    RowsRefused.throwIfAny(problems);
    pieces
        .values()
        .forEach(id -> sql.deleteFrom(CELL_CONTENT).where(CELL_CONTENT.PIECE_ID.eq(id)).execute());
    Map<String, Long> trayIds = new HashMap<>();
    trays.forEach((folded, code) -> trayIds.put(folded, code.id()));
    for (int row = 0; row < moves.size(); row++) {
      CellMove move = moves.get(row);
      long tray =
          trayIds.computeIfAbsent(
              CodeText.fold(move.tray()), folded -> newTray(writing, move.tray()));
      sql.insertInto(CELL_CONTENT)
          .set(CELL_CONTENT.TRAY_ID, tray)
          .set(CELL_CONTENT.CELL, move.cell().strip())
          .set(CELL_CONTENT.PIECE_ID, Objects.requireNonNull(pieces.get(row)))
          .execute();
      writing
          .line()
          .subject(move.tray())
          .subject(move.piece().toString())
          .row(List.of(move.piece().toString(), move.tray(), move.cell().strip()));
    }
  }

  private static long newTray(Writing writing, String tray) {
    long id = writing.register(tray, CodeKind.TRAY);
    writing
        .sql()
        .insertInto(TRAY)
        .set(TRAY.ID, id)
        .set(TRAY.RECORDED_AT, writing.recordedAt())
        .set(TRAY.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    return id;
  }

  private static Map<Integer, Long> pieces(
      DSLContext sql, List<CellMove> moves, List<RowProblem> problems) {
    Map<Integer, Long> pieces = new HashMap<>();
    Set<Long> moved = new HashSet<>();
    for (int row = 0; row < moves.size(); row++) {
      PieceName name = moves.get(row).piece();
      try {
        PieceRecord piece = Pieces.require(sql, name);
        if (!moved.add(piece.getId())) {
          problems.add(new RowProblem(row, "piece", Refusal.wrongInput("piece.two-cells", name)));
        }
        refuseImmovable(sql, name, piece);
        pieces.put(row, piece.getId());
      } catch (Refusal refusal) {
        problems.add(new RowProblem(row, "piece", refusal));
      }
    }
    return pieces;
  }

  private static void refuseImmovable(DSLContext sql, PieceName name, PieceRecord piece) {
    if (piece.getState().equals(PieceState.SCRAPPED.word())) {
      throw Refusal.refused("piece.scrapped", name).remedy("lodebook piece show " + name);
    }
    if (sql.fetchExists(LIVE_PLACEMENT, LIVE_PLACEMENT.PIECE_ID.eq(piece.getId()))) {
      throw Refusal.refused("piece.is-placed", name).remedy("lodebook piece show " + name);
    }
  }

  private static void checkCells(
      DSLContext sql,
      List<CellMove> moves,
      Map<Integer, Long> pieces,
      Map<String, Code> trays,
      List<RowProblem> problems) {
    Set<Long> leaving = new HashSet<>(pieces.values());
    Map<Cell, PieceName> filled = new HashMap<>();
    for (int row = 0; row < moves.size(); row++) {
      CellMove move = moves.get(row);
      Code tray = trays.get(CodeText.fold(move.tray()));
      if (tray == null && !CodeText.isCode(move.tray())) {
        problems.add(
            new RowProblem(
                row, "tray", Refusal.wrongInput("code.malformed", move.tray(), CodeText.LONGEST)));
      } else if (tray != null && tray.kind() != CodeKind.TRAY) {
        problems.add(new RowProblem(row, "tray", Codes.taken(tray)));
      } else if (move.cell().isBlank() || move.cell().length() > 20) {
        problems.add(
            new RowProblem(row, "cell", Refusal.wrongInput("cell.malformed", move.cell(), 20)));
      } else {
        PieceName before = filled.put(Cell.of(move.tray(), move.cell()), move.piece());
        String shown = move.tray() + " " + move.cell().strip();
        if (before != null) {
          problems.add(
              new RowProblem(
                  row, "cell", Refusal.wrongInput("cell.two-pieces", shown, before, move.piece())));
        } else if (tray != null) {
          refuseFilled(sql, row, tray, move, leaving, problems);
        }
      }
    }
  }

  private static void refuseFilled(
      DSLContext sql,
      int row,
      Code tray,
      CellMove move,
      Set<Long> leaving,
      List<RowProblem> problems) {
    var holder =
        sql.select(PIECE.ID, CODE.SHOWN, PIECE.NUMBER)
            .from(CELL_CONTENT)
            .join(PIECE)
            .on(PIECE.ID.eq(CELL_CONTENT.PIECE_ID))
            .join(CODE)
            .on(CODE.ID.eq(PIECE.LOT_ID))
            .where(CELL_CONTENT.TRAY_ID.eq(tray.id()))
            .and(CELL_CONTENT.CELL.eq(move.cell().strip()))
            .fetchOne();
    if (holder != null && !leaving.contains(holder.value1())) {
      problems.add(
          new RowProblem(
              row,
              "cell",
              Refusal.refused(
                      "cell.taken",
                      tray.shown() + " " + move.cell().strip(),
                      new PieceName(holder.value2(), holder.value3()))
                  .remedy("lodebook tray show " + tray.shown())));
    }
  }
}
