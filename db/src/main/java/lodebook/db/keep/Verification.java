package lodebook.db.keep;

import static lodebook.db.tables.Tables.CHAIN_HEAD;
import static lodebook.db.tables.Tables.HISTORY;
import static lodebook.db.tables.Tables.HISTORY_CONTINUED;
import static lodebook.db.tables.Tables.HISTORY_SUBJECT;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import lodebook.db.book.Book;
import lodebook.db.chain.LineText;
import lodebook.db.refusal.Notice;
import lodebook.db.tables.tables.records.ChainHeadRecord;
import lodebook.db.tables.tables.records.HistoryRecord;
import org.jooq.Cursor;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// Proves that a book is whole: the chain of its history, the tables that repeat the history, the
/// foreign keys, and that everything stands as the history says it should.
public final class Verification {
  private final DSLContext sql;
  private final @Nullable Head expected;
  private final List<Notice> faults = new ArrayList<>();
  private final Map<String, String> states = new TreeMap<>();

  private Verification(DSLContext sql, @Nullable Head expected) {
    this.sql = sql;
    this.expected = expected;
  }

  /// What a verification found.
  ///
  /// @param head the head of the history
  /// @param lines how many lines it has
  /// @param faults what does not fit, first line first; empty for a whole book
  public record Outcome(Head head, long lines, List<Notice> faults) {}

  /// Verifies a book.
  ///
  /// @param expected a head printed earlier that must be in the chain, or null
  public static Outcome of(Book book, @Nullable Head expected) {
    return book.read(sql -> new Verification(sql, expected).run());
  }

  private Outcome run() {
    ChainHeadRecord head = sql.selectFrom(CHAIN_HEAD).fetchSingle();
    chain(head);
    if (faults.isEmpty()) {
      faults.addAll(ForeignKeys.broken(sql));
      faults.addAll(CurrentStates.differences(sql, states));
    }
    return new Outcome(
        Head.of(head.getSequence(), head.getHash()), head.getSequence(), List.copyOf(faults));
  }

  /// Walks the chain to the first line that does not fit.
  private void chain(ChainHeadRecord head) {
    Map<Long, StringBuilder> more = continued();
    Map<Long, Set<String>> subjects = subjects();
    String hash = LineText.START;
    long line = 0;
    boolean expectedSeen = expected == null;
    try (Cursor<HistoryRecord> rows =
        sql.selectFrom(HISTORY).orderBy(HISTORY.SEQUENCE).fetchSize(1000).fetchLazy()) {
      for (HistoryRecord row : rows) {
        line++;
        StringBuilder rest = more.remove(row.getSequence());
        String text = row.getContent() + (rest == null ? "" : rest);
        Set<String> said = subjects.remove(row.getSequence());
        if (!fits(row, text, hash, line, said == null ? new TreeSet<>() : said)) {
          faults.add(Notice.of("verify.line", line));
          return;
        }
        hash = row.getHash();
        expectedSeen |= expected != null && expected.equals(Head.of(line, hash));
      }
    }
    if (line != head.getSequence() || !hash.equals(head.getHash())) {
      faults.add(Notice.of("verify.cut", line, head.getSequence()));
    } else if (!more.isEmpty() || !subjects.isEmpty()) {
      faults.add(Notice.of("verify.stray"));
    } else if (!expectedSeen) {
      faults.add(Notice.of("verify.head", expected, Head.of(line, hash)));
    }
  }

  private boolean fits(
      HistoryRecord row, String text, String before, long line, Set<String> subjects) {
    if (row.getSequence() != line || !LineText.hash(before, text).equals(row.getHash())) {
      return false;
    }
    try {
      List<List<String>> items = LineText.decode(text);
      TreeSet<String> named = new TreeSet<>();
      for (List<String> item : items) {
        if (item.getFirst().equals("subject")) {
          named.add(item.get(1));
        } else if (item.getFirst().equals("now")) {
          states.put(item.get(1) + " " + item.get(2), item.get(3));
        }
      }
      return named.equals(subjects) && items.subList(0, 6).equals(head(row));
    } catch (IllegalArgumentException unreadable) {
      return false;
    }
  }

  private static List<List<String>> head(HistoryRecord row) {
    return List.of(
        List.of("line", row.getSequence().toString()),
        List.of("stated", row.getStatedAt().toString()),
        List.of("recorded", row.getRecordedAt().toString()),
        List.of("who", row.getInitials()),
        List.of("station", row.getStation()),
        List.of("operation", row.getOperation()));
  }

  private Map<Long, StringBuilder> continued() {
    Map<Long, StringBuilder> more = new TreeMap<>();
    sql.selectFrom(HISTORY_CONTINUED)
        .orderBy(HISTORY_CONTINUED.SEQUENCE, HISTORY_CONTINUED.PART)
        .forEach(
            r ->
                more.computeIfAbsent(r.getSequence(), s -> new StringBuilder())
                    .append(r.getContent()));
    return more;
  }

  private Map<Long, Set<String>> subjects() {
    Map<Long, Set<String>> subjects = new TreeMap<>();
    sql.selectFrom(HISTORY_SUBJECT)
        .forEach(
            r ->
                subjects.computeIfAbsent(r.getSequence(), s -> new TreeSet<>()).add(r.getFolded()));
    return subjects;
  }
}
