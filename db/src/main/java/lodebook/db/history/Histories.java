package lodebook.db.history;

import static lodebook.db.tables.Tables.HISTORY;
import static lodebook.db.tables.Tables.HISTORY_CONTINUED;
import static lodebook.db.tables.Tables.HISTORY_SUBJECT;
import static org.jooq.impl.DSL.noCondition;
import static org.jooq.impl.DSL.select;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.db.book.Book;
import lodebook.db.chain.LineText;
import lodebook.db.code.CodeText;
import lodebook.db.refusal.Refusal;
import lodebook.db.stock.PieceName;
import lodebook.db.tables.tables.records.HistoryRecord;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// The history, as it was written.
public final class Histories {
  private final Book book;

  /// The history of a book.
  public Histories(Book book) {
    this.book = book;
  }

  /// Lines in their order: all, or those that speak of a number of the shop or of a piece. A number
  /// of which no line speaks is refused.
  ///
  /// @param code a number, a piece as `LOT/NUMBER`, or null for all
  public List<HistoryEntry> list(@Nullable String code) {
    Condition which =
        code == null
            ? noCondition()
            : HISTORY.SEQUENCE.in(
                select(HISTORY_SUBJECT.SEQUENCE)
                    .from(HISTORY_SUBJECT)
                    .where(HISTORY_SUBJECT.FOLDED.eq(folded(code))));
    List<HistoryEntry> lines = book.read(sql -> fetch(sql, which));
    if (code != null && lines.isEmpty()) {
      throw Refusal.refused("history.unknown", code).remedy("lodebook history");
    }
    return lines;
  }

  private static String folded(String code) {
    return CodeText.fold(code.contains("/") ? PieceName.of(code).toString() : code);
  }

  private static List<HistoryEntry> fetch(DSLContext sql, Condition which) {
    Map<Long, StringBuilder> more = new HashMap<>();
    sql.select(HISTORY_CONTINUED.SEQUENCE, HISTORY_CONTINUED.CONTENT)
        .from(HISTORY_CONTINUED)
        .join(HISTORY)
        .on(HISTORY.SEQUENCE.eq(HISTORY_CONTINUED.SEQUENCE))
        .where(which)
        .orderBy(HISTORY_CONTINUED.SEQUENCE, HISTORY_CONTINUED.PART)
        .forEach(
            r -> more.computeIfAbsent(r.value1(), s -> new StringBuilder()).append(r.value2()));
    return sql.selectFrom(HISTORY)
        .where(which)
        .orderBy(HISTORY.SEQUENCE)
        .fetch(r -> entry(r, r.getContent() + text(more.get(r.getSequence()))));
  }

  private static String text(@Nullable StringBuilder more) {
    return more == null ? "" : more.toString();
  }

  private static HistoryEntry entry(HistoryRecord row, String text) {
    List<HistoryEntry.Field> fields = new ArrayList<>();
    List<HistoryEntry.State> states = new ArrayList<>();
    int rows = 0;
    for (List<String> item : LineText.decode(text)) {
      switch (item.getFirst()) {
        case "field" -> fields.add(new HistoryEntry.Field(item.get(1), item.get(2)));
        case "now" -> states.add(new HistoryEntry.State(item.get(1), item.get(2), item.get(3)));
        case "row" -> rows++;
        default -> {
          // the head of the line stands in the table's columns as well
        }
      }
    }
    return new HistoryEntry(
        row.getSequence(),
        row.getStatedAt(),
        row.getRecordedAt(),
        row.getInitials(),
        row.getStation(),
        row.getOperation(),
        fields,
        rows,
        states,
        row.getHash());
  }
}
