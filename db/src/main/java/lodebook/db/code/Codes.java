package lodebook.db.code;

import static lodebook.db.tables.Tables.CODE;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.db.refusal.Refusal;
import org.jooq.DSLContext;
import org.jooq.Record3;
import org.jspecify.annotations.Nullable;

/// Finding and registering numbers of the shop inside a transaction.
public final class Codes {
  private static final int AT_ONCE = 500;

  private Codes() {}

  /// The thing of a number, or null.
  public static @Nullable Code find(DSLContext sql, String shown) {
    Record3<Long, String, String> found =
        sql.select(CODE.ID, CODE.SHOWN, CODE.KIND)
            .from(CODE)
            .where(CODE.FOLDED.eq(CodeText.fold(shown)))
            .fetchOne();
    return found == null
        ? null
        : new Code(found.value1(), found.value2(), CodeKind.of(found.value3()));
  }

  /// The things of many numbers, by their folded form; unknown numbers are absent.
  public static Map<String, Code> findAll(DSLContext sql, Collection<String> shown) {
    List<String> folded = shown.stream().map(CodeText::fold).distinct().toList();
    Map<String, Code> found = new HashMap<>();
    for (int from = 0; from < folded.size(); from += AT_ONCE) {
      List<String> some =
          new ArrayList<>(folded.subList(from, Math.min(folded.size(), from + AT_ONCE)));
      sql.select(CODE.ID, CODE.SHOWN, CODE.KIND, CODE.FOLDED)
          .from(CODE)
          .where(CODE.FOLDED.in(some))
          .forEach(
              r ->
                  found.put(r.value4(), new Code(r.value1(), r.value2(), CodeKind.of(r.value3()))));
    }
    return found;
  }

  /// The thing of a number that must be of a kind; else refused, naming what the number is and the
  /// command that lists the kind.
  public static Code require(DSLContext sql, String shown, CodeKind kind) {
    Code found = find(sql, shown);
    if (found == null) {
      throw unknown(shown, kind);
    }
    if (found.kind() != kind) {
      throw wrongKind(found, kind);
    }
    return found;
  }

  /// The refusal for a number that the book doesn't hold.
  public static Refusal unknown(String shown, CodeKind kind) {
    return Refusal.refused(kind.word() + ".unknown", shown).remedy(listing(kind));
  }

  /// The refusal for a number that names something else.
  public static Refusal wrongKind(Code found, CodeKind kind) {
    return Refusal.refused(kind.word() + ".is-other", found.shown(), found.kind().word())
        .remedy(listing(kind));
  }

  /// The refusal for a number that is taken.
  public static Refusal taken(Code holder) {
    return Refusal.refused("code.taken", holder.shown(), holder.kind().word())
        .remedy("lodebook trace " + holder.shown());
  }

  /// Registers a number for a new thing; a second use is refused and names the holder.
  public static void register(DSLContext sql, long id, String shown, CodeKind kind) {
    CodeText.check(shown);
    Code holder = find(sql, shown);
    if (holder != null) {
      throw taken(holder);
    }
    sql.insertInto(CODE, CODE.ID, CODE.FOLDED, CODE.SHOWN, CODE.KIND)
        .values(id, CodeText.fold(shown), shown, kind.word())
        .execute();
  }

  private static String listing(CodeKind kind) {
    return switch (kind) {
      case TRAY -> "lodebook piece list LOT";
      case SURVEY -> "lodebook rotor list";
      default -> "lodebook " + kind.word() + " list";
    };
  }
}
