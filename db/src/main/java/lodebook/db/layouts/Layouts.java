package lodebook.db.layouts;

import static lodebook.db.tables.Tables.LAYOUT;
import static lodebook.db.tables.Tables.LAYOUT_RELEASE;
import static lodebook.db.tables.Tables.LAYOUT_REVISION;
import static org.jooq.impl.DSL.noCondition;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.RingDesign;
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
import lodebook.db.tables.tables.records.LayoutReleaseRecord;
import lodebook.db.tables.tables.records.LayoutRevisionRecord;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// Importing, listing and releasing layouts.
public final class Layouts {
  private final Book book;

  /// Layouts of an open book.
  public Layouts(Book book) {
    this.book = book;
  }

  /// Takes in a revision as a draft; a draft of the same revision is replaced, a released one
  /// refuses. The magnet types it names must be known, and the ring must be one that can be built.
  public LayoutRevision importDraft(Act act, Layout layout) {
    RevisionName.checkRevision(layout.code(), layout.revision());
    return book.write(
        act,
        Permission.DESIGN,
        "layout import",
        writing -> {
          LayoutRevision taken = importInto(writing, 0, layout);
          refuseFaults(writing.sql(), taken);
          return taken;
        });
  }

  /// Takes in several revisions as [#importDraft(Act, Layout)] does, all or none.
  ///
  /// @throws RowsRefused with everything that is wrong, a row for each layout
  public List<LayoutRevision> importDrafts(Act act, List<Layout> layouts) {
    layouts.forEach(l -> RevisionName.checkRevision(l.code(), l.revision()));
    return book.write(
        act,
        Permission.DESIGN,
        "layout import",
        writing -> {
          List<LayoutRevision> taken = new ArrayList<>();
          List<RowProblem> problems = new ArrayList<>();
          for (int i = 0; i < layouts.size(); i++) {
            try {
              taken.add(importInto(writing, i, layouts.get(i)));
              for (String fault : design(writing.sql(), taken.getLast()).faults()) {
                problems.add(new RowProblem(i, "", Refusal.wrongInput("layout.faults", fault)));
              }
            } catch (RowsRefused refused) {
              problems.addAll(refused.problems());
            }
          }
          RowsRefused.throwIfAny(problems);
          return taken;
        });
  }

  private static LayoutRevision importInto(Writing writing, int index, Layout layout) {
    DSLContext sql = writing.sql();
    String name = layout.name();
    String side = layout.sideMagnetType();
    long typeId =
        RowsRefused.at(
            index, "magnetType", () -> TypesOfLayouts.id(sql, name, layout.magnetType()));
    long sideTypeId =
        side == null
            ? typeId
            : RowsRefused.at(index, "sideMagnetType", () -> TypesOfLayouts.id(sql, name, side));
    LayoutRevision before =
        RowsRefused.at(index, "revision", () -> draftOrNothing(sql, layout)).orElse(null);
    LayoutRevisionRecord row =
        before == null
            ? sql.newRecord(LAYOUT_REVISION)
            : sql.fetchSingle(LAYOUT_REVISION, LAYOUT_REVISION.ID.eq(before.id()));
    LayoutRows.fill(row, layout, typeId, sideTypeId);
    row.setRecordedAt(writing.recordedAt());
    row.setHistorySequence(writing.sequence());
    if (before == null) {
      row.setId(writing.newId());
      row.setLayoutId(RowsRefused.at(index, "layout", () -> layoutId(writing, layout.code())));
    } else {
      row.setRevision(before.layout().revision());
    }
    row.store();
    LayoutRevision after = byId(sql, row.getId());
    LayoutLines.write(writing.line(), after.layout());
    return after;
  }

  private static Optional<LayoutRevision> draftOrNothing(DSLContext sql, Layout layout) {
    LayoutRevision before = findRevision(sql, layout.code(), layout.revision());
    if (before != null && !before.draft()) {
      throw Refusal.refused("layout.released", before.layout().name())
          .remedy("lodebook layout show " + before.layout().name());
    }
    return Optional.ofNullable(before);
  }

  private static long layoutId(Writing writing, String code) {
    Code known = Codes.find(writing.sql(), code);
    if (known != null && known.kind() == CodeKind.LAYOUT) {
      return known.id();
    }
    long id = writing.register(code, CodeKind.LAYOUT);
    writing
        .sql()
        .insertInto(LAYOUT)
        .set(LAYOUT.ID, id)
        .set(LAYOUT.RECORDED_AT, writing.recordedAt())
        .set(LAYOUT.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    return id;
  }

  /// All revisions of all layouts, by code and in the order of their first import.
  public List<LayoutRevision> list() {
    return book.read(
        sql ->
            LayoutRows.fetch(sql, noCondition()).stream()
                .sorted(
                    Comparator.comparing(
                        revision -> CodeText.fold(revision.layout().code()),
                        Comparator.naturalOrder()))
                .toList());
  }

  /// A revision: `CODE@REVISION`, or `CODE` for the latest released one, or the latest draft where
  /// none is released.
  public LayoutRevision show(String name) {
    return book.read(sql -> find(sql, name));
  }

  /// A revision, named as for [#show(String)], with the magnet types it names.
  public RingDesign design(String name) {
    return book.read(sql -> design(sql, find(sql, name)));
  }

  /// Releases a draft: `CODE@REVISION`, or `CODE` for its only draft. From then on it never
  /// changes.
  public LayoutRevision release(Act act, String name) {
    return book.write(
        act, Permission.DESIGN, "layout release", writing -> releaseIn(writing, name));
  }

  private static LayoutRevision releaseIn(Writing writing, String text) {
    DSLContext sql = writing.sql();
    RevisionName name = RevisionName.of(text);
    LayoutRevision draft = name.revision() == null ? onlyDraft(sql, name.code()) : find(sql, text);
    if (!draft.draft()) {
      throw Refusal.refused("layout.released-already", draft.layout().name())
          .remedy("lodebook layout show " + draft.layout().name());
    }
    refuseFaults(sql, draft);
    LayoutReleaseRecord release = sql.newRecord(LAYOUT_RELEASE);
    release.from(sql.fetchSingle(LAYOUT_REVISION, LAYOUT_REVISION.ID.eq(draft.id())));
    release.setReleasedBy(writing.person().id());
    release.setReleasedAt(writing.statedAt());
    release.setReleaseSequence(writing.sequence());
    release.insert();
    writing.line().subject(draft.layout().code());
    writing.line().field("layout", draft.layout().name());
    writing.line().now("layout", draft.layout().name(), "released");
    return byId(sql, draft.id());
  }

  private static void refuseFaults(DSLContext sql, LayoutRevision revision) {
    List<String> faults = design(sql, revision).faults();
    if (!faults.isEmpty()) {
      throw Refusal.wrongInput("layout.faults", String.join("\n", faults));
    }
  }

  private static LayoutRevision onlyDraft(DSLContext sql, String code) {
    List<LayoutRevision> all = revisions(sql, code);
    List<LayoutRevision> drafts = all.stream().filter(LayoutRevision::draft).toList();
    if (drafts.isEmpty()) {
      throw Refusal.refused("layout.no-draft", all.getFirst().layout().code())
          .remedy("lodebook layout show " + all.getFirst().layout().code());
    }
    if (drafts.size() > 1) {
      String names =
          String.join(", ", drafts.stream().map(draft -> draft.layout().name()).toList());
      throw Refusal.refused("layout.several-drafts", drafts.getFirst().layout().code(), names)
          .remedy("lodebook layout release " + drafts.getFirst().layout().name());
    }
    return drafts.getFirst();
  }

  private static List<LayoutRevision> revisions(DSLContext sql, String code) {
    Code layout = Codes.require(sql, code, CodeKind.LAYOUT);
    return LayoutRows.fetch(sql, LAYOUT_REVISION.LAYOUT_ID.eq(layout.id()));
  }

  private static @Nullable LayoutRevision findRevision(
      DSLContext sql, String code, String revision) {
    Code layout = Codes.find(sql, code);
    if (layout == null || layout.kind() != CodeKind.LAYOUT) {
      return null;
    }
    return LayoutRows.fetch(sql, LAYOUT_REVISION.LAYOUT_ID.eq(layout.id())).stream()
        .filter(each -> CodeText.fold(each.layout().revision()).equals(CodeText.fold(revision)))
        .findFirst()
        .orElse(null);
  }

  /// The revision of a name inside a transaction, as [#show(String)] finds it.
  public static LayoutRevision find(DSLContext sql, String text) {
    RevisionName name = RevisionName.of(text);
    List<LayoutRevision> all = revisions(sql, name.code());
    if (name.revision() != null) {
      LayoutRevision found = findRevision(sql, name.code(), name.revision());
      if (found == null) {
        throw Refusal.refused(
                "layout.no-revision",
                all.getFirst().layout().code(),
                name.revision(),
                String.join(", ", all.stream().map(each -> each.layout().revision()).toList()))
            .remedy("lodebook layout list");
      }
      return found;
    }
    LayoutRevision released = latestReleased(sql, all);
    return released == null ? all.getLast() : released;
  }

  /// The released revision of a name inside a transaction; a draft refuses.
  public static LayoutRevision requireReleased(DSLContext sql, String text) {
    LayoutRevision found = find(sql, text);
    if (found.draft()) {
      throw Refusal.refused("layout.not-released", found.layout().name())
          .remedy("lodebook layout release " + found.layout().name());
    }
    return found;
  }

  private static @Nullable LayoutRevision latestReleased(DSLContext sql, List<LayoutRevision> all) {
    Long latest =
        sql.select(LAYOUT_RELEASE.ID)
            .from(LAYOUT_RELEASE)
            .where(LAYOUT_RELEASE.ID.in(all.stream().map(LayoutRevision::id).toList()))
            .orderBy(LAYOUT_RELEASE.RELEASE_SEQUENCE.desc())
            .limit(1)
            .fetchOne(LAYOUT_RELEASE.ID);
    return all.stream()
        .filter(each -> latest != null && each.id() == latest)
        .findFirst()
        .orElse(null);
  }

  /// The revision of an id inside a transaction.
  public static LayoutRevision byId(DSLContext sql, long id) {
    return LayoutRows.fetch(sql, LAYOUT_REVISION.ID.eq(id)).getFirst();
  }

  /// A revision inside a transaction with the magnet types it names.
  public static RingDesign design(DSLContext sql, LayoutRevision revision) {
    String side = revision.layout().sideMagnetType();
    return new RingDesign(
        revision.layout(),
        TypesOfLayouts.type(sql, revision.layout().magnetType()),
        side == null ? null : TypesOfLayouts.type(sql, side));
  }
}
