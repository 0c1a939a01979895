package lodebook.db.stock;

import static lodebook.db.tables.Tables.CELL_CONTENT;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PIECE_READING;
import static lodebook.db.tables.Tables.PIECE_STRENGTH;
import static lodebook.db.tables.Tables.TRAY;

import java.time.Instant;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import lodebook.assembly.magnet.Strength;
import lodebook.db.book.Bulk;
import lodebook.db.book.Writing;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.meters.Meter;
import lodebook.db.meters.Meters;
import lodebook.db.stock.LotStock.Cell;
import org.jspecify.annotations.Nullable;

/// Writes readings that were found right: pieces, cells, readings, strengths, history.
final class ReadingWriter {
  private final Writing writing;
  private final LotStock stock;
  private final Map<Long, Long> ids = new HashMap<>();
  private final Map<Long, Long> newPieces = new HashMap<>();

  ReadingWriter(Writing writing, LotStock stock) {
    this.writing = writing;
    this.stock = stock;
    stock.pieces().forEach((number, piece) -> ids.put(number, piece.id()));
  }

  long idOf(ReadingRow row) {
    return Objects.requireNonNull(ids.get(row.number()), "an id for every row");
  }

  @Nullable Meter meterOf(ReadingRow row) {
    String meter = row.meter();
    return meter == null ? null : stock.meters().get(CodeText.fold(meter));
  }

  /// Gives new pieces their ids; how many are new.
  int number(List<ReadingRow> rows) {
    for (ReadingRow row : rows) {
      if (!ids.containsKey(row.number())) {
        long id = writing.newId();
        ids.put(row.number(), id);
        newPieces.put(id, row.number());
      }
    }
    return newPieces.size();
  }

  /// Writes the pieces with their new strengths: new ones as rows, known ones changed.
  void pieces(Map<Long, Strength> strengths) {
    List<@Nullable Object[]> inserted = new ArrayList<>();
    List<@Nullable Object[]> changed = new ArrayList<>();
    strengths.forEach(
        (id, strength) -> {
          Long number = newPieces.get(id);
          double remanence = strength.remanenceTesla();
          double uncertainty = strength.standardUncertaintyTesla();
          if (number == null) {
            changed.add(new @Nullable Object[] {remanence, uncertainty, id});
          } else {
            inserted.add(
                new @Nullable Object[] {
                  id,
                  stock.code().id(),
                  number,
                  PieceState.USABLE.word(),
                  true,
                  remanence,
                  uncertainty,
                  writing.recordedAt(),
                  writing.sequence()
                });
          }
        });
    Bulk.insert(
        writing.sql(),
        PIECE,
        List.of(
            PIECE.ID,
            PIECE.LOT_ID,
            PIECE.NUMBER,
            PIECE.STATE,
            PIECE.CLEAR,
            PIECE.REMANENCE_TESLA,
            PIECE.REMANENCE_UNCERTAINTY_TESLA,
            PIECE.RECORDED_AT,
            PIECE.HISTORY_SEQUENCE),
        inserted);
    Bulk.update(
        writing.sql(),
        PIECE,
        List.of(PIECE.REMANENCE_TESLA, PIECE.REMANENCE_UNCERTAINTY_TESLA),
        PIECE.ID,
        changed);
  }

  /// Makes trays that are named for the first time and lays the pieces into their cells.
  void cells(List<ReadingRow> rows) {
    Map<String, Long> trays = new HashMap<>();
    stock.trays().forEach((folded, code) -> trays.put(folded, code.id()));
    Set<Cell> filled = new HashSet<>(stock.inCells().keySet());
    List<@Nullable Object[]> contents = new ArrayList<>();
    for (ReadingRow row : rows) {
      String tray = row.tray();
      String cell = row.cell();
      if (tray != null && cell != null && filled.add(Cell.of(tray, cell))) {
        long id = trays.computeIfAbsent(CodeText.fold(tray), folded -> newTray(tray));
        contents.add(new @Nullable Object[] {id, cell.strip(), idOf(row)});
      }
    }
    Bulk.insert(
        writing.sql(),
        CELL_CONTENT,
        List.of(CELL_CONTENT.TRAY_ID, CELL_CONTENT.CELL, CELL_CONTENT.PIECE_ID),
        contents);
  }

  private long newTray(String tray) {
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

  /// Writes the readings and their rows of history.
  void readings(List<ReadingRow> rows) {
    long first = writing.newIds(rows.size());
    Map<String, Long> repeats = new HashMap<>(stock.repeats());
    List<@Nullable Object[]> written = new ArrayList<>(rows.size());
    for (int i = 0; i < rows.size(); i++) {
      ReadingRow row = rows.get(i);
      String fingerprint = Fingerprint.of(row);
      String same = LotStock.repeatOf(idOf(row), fingerprint);
      long repeat = repeats.getOrDefault(same, 0L);
      repeats.put(same, repeat + 1);
      String meter = row.meter();
      String by = row.by();
      Instant at = row.at();
      written.add(
          new @Nullable Object[] {
            first + i,
            idOf(row),
            row.fluxTesla(),
            row.standoffMetres(),
            row.temperatureCelsius(),
            meter == null ? null : stock.meterIds().get(CodeText.fold(meter)),
            personOf(by),
            fingerprint,
            repeat,
            false,
            at == null ? writing.statedAt() : at,
            writing.recordedAt(),
            writing.sequence()
          });
      writing.line().row(List.of(row.canonical().split("\u001f", -1)));
    }
    Bulk.insert(
        writing.sql(),
        PIECE_READING,
        List.of(
            PIECE_READING.ID,
            PIECE_READING.PIECE_ID,
            PIECE_READING.FLUX_TESLA,
            PIECE_READING.STANDOFF_METRES,
            PIECE_READING.TEMPERATURE_CELSIUS,
            PIECE_READING.METER_ID,
            PIECE_READING.PERSON_ID,
            PIECE_READING.FINGERPRINT,
            PIECE_READING.REPEAT_NUMBER,
            PIECE_READING.DOUBTED,
            PIECE_READING.STATED_AT,
            PIECE_READING.RECORDED_AT,
            PIECE_READING.HISTORY_SEQUENCE),
        written);
  }

  private long personOf(@Nullable String by) {
    return by == null
        ? writing.person().id()
        : Objects.requireNonNull(stock.people().get(CodeText.fold(by)), "people were checked");
  }

  /// Earlier readings of the lot's pieces that count, by piece.
  Map<Long, List<TakenReading>> sureReadingsBefore() {
    Map<Long, List<TakenReading>> taken = new HashMap<>();
    if (stock.repeats().isEmpty()) {
      return taken;
    }
    Map<Long, Meter> meters = Meters.all(writing.sql());
    writing
        .sql()
        .select(PIECE_READING.asterisk())
        .from(PIECE_READING)
        .join(PIECE)
        .on(PIECE.ID.eq(PIECE_READING.PIECE_ID))
        .where(PIECE.LOT_ID.eq(stock.code().id()))
        .and(PIECE_READING.DOUBTED.eq(false))
        .and(PIECE_READING.HISTORY_SEQUENCE.lt(writing.sequence()))
        .forEach(
            r ->
                taken
                    .computeIfAbsent(r.get(PIECE_READING.PIECE_ID), id -> new ArrayList<>())
                    .add(
                        new TakenReading(
                            r.get(PIECE_READING.FLUX_TESLA),
                            r.get(PIECE_READING.STANDOFF_METRES),
                            r.get(PIECE_READING.TEMPERATURE_CELSIUS),
                            meters.get(r.get(PIECE_READING.METER_ID)))));
    return taken;
  }

  /// Writes the log of estimates.
  void estimates(Map<Long, Strength> estimates, Map<Long, List<TakenReading>> read) {
    long first = writing.newIds(estimates.size());
    List<@Nullable Object[]> log = new ArrayList<>(estimates.size());
    estimates.forEach(
        (piece, strength) ->
            log.add(
                new @Nullable Object[] {
                  first + log.size(),
                  piece,
                  strength.remanenceTesla(),
                  strength.standardUncertaintyTesla(),
                  (long) Objects.requireNonNull(read.get(piece)).size(),
                  writing.recordedAt(),
                  writing.sequence()
                }));
    Bulk.insert(
        writing.sql(),
        PIECE_STRENGTH,
        List.of(
            PIECE_STRENGTH.ID,
            PIECE_STRENGTH.PIECE_ID,
            PIECE_STRENGTH.REMANENCE_TESLA,
            PIECE_STRENGTH.REMANENCE_UNCERTAINTY_TESLA,
            PIECE_STRENGTH.READINGS,
            PIECE_STRENGTH.RECORDED_AT,
            PIECE_STRENGTH.HISTORY_SEQUENCE),
        log);
  }
}
