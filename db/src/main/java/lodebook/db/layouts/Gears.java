package lodebook.db.layouts;

import static lodebook.db.tables.Tables.GEAR_MODEL;
import static lodebook.db.tables.Tables.GEAR_RELEASE;
import static lodebook.db.tables.Tables.GEAR_REVISION;
import static org.jooq.impl.DSL.noCondition;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.GearRule;
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
import lodebook.db.tables.tables.records.GearReleaseRecord;
import lodebook.db.tables.tables.records.GearRevisionRecord;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// Importing, listing and releasing gear models.
public final class Gears {
  private final Book book;

  /// Gear models of an open book.
  public Gears(Book book) {
    this.book = book;
  }

  /// Takes in a revision as a draft; a draft of the same revision is replaced, a released one
  /// refuses. Its layouts must be in the book; what breaks the gear rule is wrong input.
  public GearRevision importDraft(Act act, GearDraft draft) {
    RevisionName.checkRevision(draft.code(), draft.revision());
    for (String layout : List.of(draft.inner(), draft.outer())) {
      if (RevisionName.of(layout).revision() == null) {
        throw Refusal.wrongInput("gear.layout-unpinned", draft.code(), layout);
      }
    }
    return book.write(act, Permission.DESIGN, "gear import", writing -> importInto(writing, draft));
  }

  private static GearRevision importInto(Writing writing, GearDraft draft) {
    DSLContext sql = writing.sql();
    LayoutRevision inner = RowsRefused.at(0, "inner", () -> Layouts.find(sql, draft.inner()));
    LayoutRevision outer = RowsRefused.at(0, "outer", () -> Layouts.find(sql, draft.outer()));
    Code code = Codes.find(sql, draft.code());
    GearRevision before = null;
    if (code != null && code.kind() == CodeKind.GEAR) {
      for (GearRevision each : revisions(sql, code)) {
        if (CodeText.fold(each.model().revision()).equals(CodeText.fold(draft.revision()))) {
          before = each;
        }
      }
    }
    refuseReleased(before);
    GearRevisionRecord row =
        before == null
            ? sql.newRecord(GEAR_REVISION)
            : sql.fetchSingle(GEAR_REVISION, GEAR_REVISION.ID.eq(before.id()));
    GearRows.fill(row, draft, inner.id(), outer.id());
    row.setRecordedAt(writing.recordedAt());
    row.setHistorySequence(writing.sequence());
    if (before == null) {
      row.setId(writing.newId());
      row.setGearId(
          code != null && code.kind() == CodeKind.GEAR
              ? code.id()
              : RowsRefused.at(0, "gear", () -> begin(writing, draft.code())));
    } else {
      row.setRevision(before.model().revision());
    }
    row.store();
    GearRevision after = byId(sql, row.getId());
    RowsRefused.throwIfAny(faults(after));
    tell(writing, after, inner, outer);
    return after;
  }

  private static long begin(Writing writing, String code) {
    long id = writing.register(code, CodeKind.GEAR);
    writing
        .sql()
        .insertInto(GEAR_MODEL)
        .set(GEAR_MODEL.ID, id)
        .set(GEAR_MODEL.RECORDED_AT, writing.recordedAt())
        .set(GEAR_MODEL.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    return id;
  }

  private static void refuseReleased(@Nullable GearRevision before) {
    if (before != null && !before.draft()) {
      Refusal refusal =
          Refusal.refused("gear.released", before.name())
              .remedy("lodebook gear show " + before.name());
      throw new RowsRefused(List.of(new RowProblem(0, "revision", refusal)));
    }
  }

  /// What is wrong with a model; each sentence names the key at fault.
  private static List<RowProblem> faults(GearRevision revision) {
    return GearRule.faults(revision.model()).stream()
        .map(fault -> new RowProblem(0, "", Refusal.wrongInput("gear.faults", fault)))
        .toList();
  }

  private static void tell(
      Writing writing, GearRevision gear, LayoutRevision inner, LayoutRevision outer) {
    writing
        .line()
        .subject(gear.model().code())
        .field("gear", gear.model().code())
        .field("revision", gear.model().revision())
        .field("inner", inner.layout().name())
        .field("outer", outer.layout().name())
        .field("modulatorPieces", gear.model().modulatorPieces())
        .field("held", gear.model().held().name().toLowerCase(Locale.ROOT))
        .field("modulatorInnerRadiusMetres", gear.model().modulatorInnerRadiusMetres())
        .field("modulatorOuterRadiusMetres", gear.model().modulatorOuterRadiusMetres())
        .field("stackMetres", gear.model().stackMetres())
        .field("requiredPullOutNewtonMetres", gear.model().requiredPullOutNewtonMetres());
  }

  /// All revisions of all gear models, by code and in the order of their first import.
  public List<GearRevision> list() {
    return book.read(
        sql ->
            GearRows.fetch(sql, noCondition()).stream()
                .sorted(Comparator.comparing(gear -> CodeText.fold(gear.model().code())))
                .toList());
  }

  /// A revision: `CODE@REVISION`, or `CODE` for the latest released one, or the latest draft where
  /// none is released.
  public GearRevision show(String name) {
    return book.read(sql -> find(sql, name));
  }

  /// Releases a draft: `CODE@REVISION`, or `CODE` for its only draft. Its layouts must be released.
  public GearRevision release(Act act, String name) {
    return book.write(act, Permission.DESIGN, "gear release", writing -> releaseIn(writing, name));
  }

  private static GearRevision releaseIn(Writing writing, String text) {
    DSLContext sql = writing.sql();
    GearRevision draft = draftOf(sql, text);
    RowsRefused.throwIfAny(faults(draft));
    for (long layout : List.of(draft.innerLayoutId(), draft.outerLayoutId())) {
      LayoutRevision revision = Layouts.byId(sql, layout);
      if (revision.draft()) {
        throw Refusal.refused("gear.pins-draft", draft.name(), revision.layout().name())
            .remedy("lodebook layout release " + revision.layout().name());
      }
    }
    GearReleaseRecord release = sql.newRecord(GEAR_RELEASE);
    release.from(sql.fetchSingle(GEAR_REVISION, GEAR_REVISION.ID.eq(draft.id())));
    release.setReleasedBy(writing.person().id());
    release.setReleasedAt(writing.statedAt());
    release.setReleaseSequence(writing.sequence());
    release.insert();
    writing
        .line()
        .subject(draft.model().code())
        .field("gear", draft.name())
        .now("gear", draft.name(), "released");
    return byId(sql, draft.id());
  }

  private static GearRevision draftOf(DSLContext sql, String text) {
    RevisionName name = RevisionName.of(text);
    if (name.revision() != null) {
      GearRevision found = find(sql, text);
      if (!found.draft()) {
        throw Refusal.refused("gear.released-already", found.name())
            .remedy("lodebook gear show " + found.name());
      }
      return found;
    }
    Code code = Codes.require(sql, name.code(), CodeKind.GEAR);
    List<GearRevision> drafts = revisions(sql, code).stream().filter(GearRevision::draft).toList();
    if (drafts.isEmpty()) {
      throw Refusal.refused("gear.no-draft", code.shown())
          .remedy("lodebook gear show " + code.shown());
    }
    if (drafts.size() > 1) {
      throw Refusal.refused(
              "gear.several-drafts",
              code.shown(),
              String.join(", ", drafts.stream().map(GearRevision::name).toList()))
          .remedy("lodebook gear release " + drafts.getFirst().name());
    }
    return drafts.getFirst();
  }

  private static List<GearRevision> revisions(DSLContext sql, Code code) {
    return GearRows.fetch(sql, GEAR_REVISION.GEAR_ID.eq(code.id()));
  }

  /// The revision of a name inside a transaction, as [#show(String)] finds it.
  public static GearRevision find(DSLContext sql, String text) {
    RevisionName name = RevisionName.of(text);
    Code code = Codes.require(sql, name.code(), CodeKind.GEAR);
    List<GearRevision> all = revisions(sql, code);
    if (name.revision() == null) {
      Long latest =
          sql.select(GEAR_RELEASE.ID)
              .from(GEAR_RELEASE)
              .where(GEAR_RELEASE.GEAR_ID.eq(code.id()))
              .orderBy(GEAR_RELEASE.RELEASE_SEQUENCE.desc())
              .limit(1)
              .fetchOne(GEAR_RELEASE.ID);
      return latest == null ? all.getLast() : byId(sql, latest);
    }
    String revision = CodeText.fold(name.revision());
    return all.stream()
        .filter(each -> CodeText.fold(each.model().revision()).equals(revision))
        .findFirst()
        .orElseThrow(
            () ->
                Refusal.refused(
                        "gear.no-revision",
                        code.shown(),
                        String.valueOf(name.revision()),
                        String.join(
                            ", ", all.stream().map(each -> each.model().revision()).toList()))
                    .remedy("lodebook gear list"));
  }

  /// The released revision of a name inside a transaction; a draft refuses.
  public static GearRevision requireReleased(DSLContext sql, String text) {
    GearRevision found = find(sql, text);
    if (found.draft()) {
      throw Refusal.refused("gear.not-released", found.name())
          .remedy("lodebook gear release " + found.name());
    }
    return found;
  }

  /// The revision of an id inside a transaction.
  public static GearRevision byId(DSLContext sql, long id) {
    return GearRows.fetch(sql, GEAR_REVISION.ID.eq(id)).getFirst();
  }
}
