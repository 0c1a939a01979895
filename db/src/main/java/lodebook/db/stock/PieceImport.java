package lodebook.db.stock;

import static lodebook.db.tables.Tables.GRADE;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Strength;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import org.jspecify.annotations.Nullable;

/// Taking in the readings of single pieces.
public final class PieceImport {
  private final Book book;
  private final StrengthEstimator estimator;

  /// Taking readings into a book; strengths by the craft's gauge.
  public PieceImport(Book book) {
    this(book, new GaugeEstimator());
  }

  /// Taking readings into a book.
  ///
  /// @param estimator turns a piece's readings into its strength
  public PieceImport(Book book, StrengthEstimator estimator) {
    this.book = book;
    this.estimator = estimator;
  }

  /// Takes in readings of a lot's pieces, all or none. Each piece read gets a new estimate from all
  /// its readings, except those that were taken before its tray was declared unsure.
  ///
  /// @param lot number of the lot
  /// @param rows the readings
  /// @param again why readings that are in the book already are taken in once more, or null where
  ///   they are refused
  public ImportedReadings importReadings(
      Act act, String lot, List<ReadingRow> rows, @Nullable String again) {
    if (again != null && again.isBlank()) {
      throw Refusal.wrongInput("why.missing");
    }
    return book.write(
        act,
        Permission.ANYTHING_ELSE,
        "piece import",
        writing -> {
          LotStock stock = LotStock.of(writing.sql(), lot, rows);
          ReadingCheck.refuseFaults(stock, rows, again != null);
          writing
              .line()
              .subject(stock.code().shown())
              .field("lot", stock.code().shown())
              .field("again", again);
          return take(writing, stock, rows);
        });
  }

  private ImportedReadings take(Writing writing, LotStock stock, List<ReadingRow> rows) {
    ReadingWriter writer = new ReadingWriter(writing, stock);
    int newPieces = writer.number(rows);
    Map<Long, List<TakenReading>> taken = writer.sureReadingsBefore();
    for (ReadingRow row : rows) {
      taken
          .computeIfAbsent(writer.idOf(row), id -> new ArrayList<>())
          .add(
              new TakenReading(
                  row.fluxTesla(),
                  row.standoffMetres(),
                  row.temperatureCelsius(),
                  writer.meterOf(row)));
    }
    Map<Long, List<TakenReading>> read = new LinkedHashMap<>();
    rows.forEach(
        row -> {
          long id = writer.idOf(row);
          read.put(id, Objects.requireNonNull(taken.get(id)));
        });
    Map<Long, Strength> estimates = estimates(writing, stock, read);
    writer.pieces(estimates);
    writer.cells(rows);
    writer.readings(rows);
    writer.estimates(estimates, read);
    return new ImportedReadings(
        rows.size(),
        read.size(),
        newPieces,
        (int) rows.stream().filter(r -> r.meter() == null).count(),
        (int) rows.stream().filter(r -> r.temperatureCelsius() == null).count());
  }

  private Map<Long, Strength> estimates(
      Writing writing, LotStock stock, Map<Long, List<TakenReading>> read) {
    MagnetType type =
        Objects.requireNonNull(
            MagnetTypes.all(writing.sql()).get(stock.lot().getTypeId()), "type of a lot");
    Grade grade =
        writing
            .sql()
            .selectFrom(GRADE)
            .where(GRADE.NAME.eq(type.grade()))
            .fetchSingle(Grades::grade);
    Map<Long, Strength> estimates = new LinkedHashMap<>();
    read.forEach((id, readings) -> estimates.put(id, estimator.estimate(type, grade, readings)));
    return estimates;
  }
}
