package lodebook.db.book;

import static lodebook.db.tables.Tables.HISTORY;
import static lodebook.db.tables.Tables.HISTORY_CONTINUED;
import static lodebook.db.tables.Tables.HISTORY_SUBJECT;

import java.util.ArrayList;
import java.util.List;
import lodebook.db.chain.Line;
import org.jooq.DSLContext;

/// Stores a line of history, its text cut to the columns' width.
final class HistoryWriter {
  private static final int WIDTH = 32_000;

  private HistoryWriter() {}

  static void append(DSLContext sql, Line.Head head, Line line, String text, String hash) {
    List<String> parts = cut(text);
    sql.insertInto(HISTORY)
        .set(HISTORY.SEQUENCE, head.sequence())
        .set(HISTORY.STATED_AT, head.statedAt())
        .set(HISTORY.RECORDED_AT, head.recordedAt())
        .set(HISTORY.INITIALS, head.initials())
        .set(HISTORY.STATION, head.station())
        .set(HISTORY.OPERATION, head.operation())
        .set(HISTORY.CONTENT, parts.getFirst())
        .set(HISTORY.HASH, hash)
        .execute();
    for (int part = 1; part < parts.size(); part++) {
      sql.insertInto(HISTORY_CONTINUED)
          .set(HISTORY_CONTINUED.SEQUENCE, head.sequence())
          .set(HISTORY_CONTINUED.PART, (long) part)
          .set(HISTORY_CONTINUED.CONTENT, parts.get(part))
          .execute();
    }
    for (String subject : line.subjects()) {
      sql.insertInto(HISTORY_SUBJECT)
          .set(HISTORY_SUBJECT.SEQUENCE, head.sequence())
          .set(HISTORY_SUBJECT.FOLDED, subject)
          .execute();
    }
  }

  /// Parts of at most the columns' width; no character is cut in two.
  static List<String> cut(String text) {
    List<String> parts = new ArrayList<>();
    int from = 0;
    do {
      int to = Math.min(text.length(), from + WIDTH);
      if (to < text.length() && Character.isHighSurrogate(text.charAt(to - 1))) {
        to--;
      }
      parts.add(text.substring(from, to));
      from = to;
    } while (from < text.length());
    return parts;
  }
}
