package lodebook.db.keep;

import static lodebook.db.tables.Tables.CHAIN_HEAD;
import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.PIECE;

import java.time.Instant;
import java.util.Map;
import java.util.TreeMap;
import lodebook.db.book.Book;
import lodebook.db.tables.tables.records.ChainHeadRecord;
import org.jooq.DSLContext;
import org.jooq.impl.DSL;

/// What a book is.
///
/// @param where the folder or address
/// @param name its name
/// @param created when it was made
/// @param generation generation of its tables
/// @param revision how often it was changed
/// @param head its head
/// @param people people who sign
/// @param pieces numbered pieces
/// @param things how many lots, rotors and so on, by kind
public record BookInfo(
    String where,
    String name,
    Instant created,
    long generation,
    long revision,
    Head head,
    int people,
    int pieces,
    Map<String, Integer> things) {

  /// What an open book is.
  public static BookInfo of(Book book) {
    return book.read(sql -> of(book.address().shown(), sql));
  }

  private static BookInfo of(String where, DSLContext sql) {
    ChainHeadRecord head = sql.selectFrom(CHAIN_HEAD).fetchSingle();
    Map<String, Integer> things = new TreeMap<>();
    sql.select(CODE.KIND, DSL.count())
        .from(CODE)
        .groupBy(CODE.KIND)
        .forEach(r -> things.put(r.value1(), r.value2()));
    return new BookInfo(
        where,
        head.getBookName(),
        head.getCreatedAt(),
        head.getGeneration(),
        head.getRevision(),
        Head.of(head.getSequence(), head.getHash()),
        sql.fetchCount(PERSON, PERSON.RETIRED.eq(false)),
        sql.fetchCount(PIECE),
        things);
  }
}
