package lodebook.db.trace;

import static lodebook.db.tables.Tables.BATCH;
import static lodebook.db.tables.Tables.CELL_CONTENT;
import static lodebook.db.tables.Tables.GEAR_RELEASE;
import static lodebook.db.tables.Tables.LAYOUT_REVISION;
import static lodebook.db.tables.Tables.MEMBERSHIP;
import static lodebook.db.tables.Tables.MEMBERSHIP_END;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PIECE_READING;
import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.PLACEMENT_END;
import static lodebook.db.tables.Tables.READING;
import static lodebook.db.tables.Tables.ROTOR;
import static lodebook.db.tables.Tables.SURVEY;
import static lodebook.db.tables.Tables.UNIT;

import java.time.Instant;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jooq.Field;
import org.jooq.Record;
import org.jspecify.annotations.Nullable;

/// One step of a trace, either way.
///
/// Placements that were corrected never were; their pieces are left out. Others carry from when to
/// when.
final class Links {
  private final DSLContext sql;
  private final Things things;

  /// A thing and from when to when it belongs.
  ///
  /// @param magnets how many unmeasured magnets it stands for, or null where it is no such
  record Link(
      Thing thing, @Nullable Instant from, @Nullable Instant to, @Nullable Integer magnets) {
    /// A thing that belongs without beginning or end.
    static Link always(Thing thing) {
      return new Link(thing, null, null, null);
    }
  }

  Links(DSLContext sql, Things things) {
    this.sql = sql;
    this.things = things;
  }

  /// What a thing was made from, one step.
  List<Link> madeFrom(Thing thing) {
    return switch (thing.kind()) {
      case "unit" -> members(MEMBERSHIP.HOLDER_ID.eq(thing.id()), MEMBERSHIP.MEMBER_ID);
      case "batch" -> rotors(ROTOR.BATCH_ID.eq(thing.id()));
      case "rotor" -> magnets(thing.id());
      case "lot" -> things.supplierOf(thing).map(Link::always).stream().toList();
      case "piece" ->
          plain(
              sql.select(PIECE.LOT_ID)
                  .from(PIECE)
                  .where(PIECE.ID.eq(thing.id()))
                  .fetch(PIECE.LOT_ID));
      case "tray" -> inTray(thing.id());
      case "survey" ->
          plain(
              sql.selectDistinct(READING.METER_ID)
                  .from(READING)
                  .where(READING.SURVEY_ID.eq(thing.id()))
                  .orderBy(READING.METER_ID)
                  .fetch(READING.METER_ID));
      default -> List.of();
    };
  }

  /// What a thing went into, one step.
  List<Link> wentInto(Thing thing) {
    return switch (thing.kind()) {
      case "supplier lot" -> things.supplied(thing.code()).stream().map(Link::always).toList();
      case "lot" -> lotWentInto(thing.id());
      case "piece" -> placements(PLACEMENT.PIECE_ID.eq(thing.id()));
      case "rotor" -> rotorWentInto(thing.id());
      case "survey" ->
          plain(
              sql.select(SURVEY.ROTOR_ID)
                  .from(SURVEY)
                  .where(SURVEY.ID.eq(thing.id()))
                  .fetch(SURVEY.ROTOR_ID));
      case "meter" -> meterWentInto(thing.id());
      case "tray" -> inTray(thing.id());
      case "batch" ->
          plain(
              sql.select(UNIT.ID)
                  .from(UNIT)
                  .where(UNIT.BATCH_ID.eq(thing.id()))
                  .orderBy(UNIT.ID)
                  .fetch(UNIT.ID));
      case "layout" ->
          rotors(
              ROTOR.LAYOUT_REVISION_ID.in(
                  sql.select(LAYOUT_REVISION.ID)
                      .from(LAYOUT_REVISION)
                      .where(LAYOUT_REVISION.LAYOUT_ID.eq(thing.id()))));
      case "gear" ->
          plain(
              sql.select(BATCH.ID)
                  .from(BATCH)
                  .join(GEAR_RELEASE)
                  .on(GEAR_RELEASE.ID.eq(BATCH.GEAR_REVISION_ID))
                  .where(GEAR_RELEASE.GEAR_ID.eq(thing.id()))
                  .orderBy(BATCH.ID)
                  .fetch(BATCH.ID));
      default -> List.of();
    };
  }

  private List<Link> lotWentInto(long lotId) {
    List<Link> links = new ArrayList<>();
    sql.selectDistinct(PLACEMENT.PIECE_ID)
        .from(PLACEMENT)
        .where(PLACEMENT.LOT_ID.eq(lotId).and(PLACEMENT.PIECE_ID.isNotNull()))
        .orderBy(PLACEMENT.PIECE_ID)
        .forEach(row -> links.add(Link.always(things.piece(row.value1()))));
    links.removeIf(link -> placements(PLACEMENT.PIECE_ID.eq(link.thing().id())).isEmpty());
    links.addAll(placements(PLACEMENT.LOT_ID.eq(lotId).and(PLACEMENT.PIECE_ID.isNull())));
    return links;
  }

  private List<Link> rotorWentInto(long rotorId) {
    List<Link> links =
        new ArrayList<>(members(MEMBERSHIP.MEMBER_ID.eq(rotorId), MEMBERSHIP.HOLDER_ID));
    if (links.isEmpty()) {
      links.addAll(
          plain(
              sql.select(ROTOR.BATCH_ID)
                  .from(ROTOR)
                  .where(ROTOR.ID.eq(rotorId).and(ROTOR.BATCH_ID.isNotNull()))
                  .fetch(ROTOR.BATCH_ID)));
    }
    return links;
  }

  private List<Link> meterWentInto(long meterId) {
    List<Link> links = new ArrayList<>();
    sql.selectDistinct(PIECE_READING.PIECE_ID)
        .from(PIECE_READING)
        .where(PIECE_READING.METER_ID.eq(meterId))
        .orderBy(PIECE_READING.PIECE_ID)
        .forEach(row -> links.add(Link.always(things.piece(row.value1()))));
    links.addAll(
        plain(
            sql.selectDistinct(READING.SURVEY_ID)
                .from(READING)
                .where(READING.METER_ID.eq(meterId))
                .orderBy(READING.SURVEY_ID)
                .fetch(READING.SURVEY_ID)));
    return links;
  }

  private List<Link> plain(List<Long> ids) {
    return ids.stream().map(id -> Link.always(things.of(id))).toList();
  }

  private List<Link> rotors(Condition condition) {
    return plain(
        sql.select(ROTOR.ID).from(ROTOR).where(condition).orderBy(ROTOR.ID).fetch(ROTOR.ID));
  }

  private List<Link> members(Condition condition, Field<Long> other) {
    return sql.select(other, MEMBERSHIP.FROM_AT, MEMBERSHIP_END.TO_AT)
        .from(MEMBERSHIP)
        .leftJoin(MEMBERSHIP_END)
        .on(MEMBERSHIP_END.MEMBERSHIP_ID.eq(MEMBERSHIP.ID))
        .where(condition)
        .orderBy(MEMBERSHIP.ID)
        .fetch(row -> new Link(things.of(row.value1()), row.value2(), row.value3(), null));
  }

  private List<Link> magnets(long rotorId) {
    return counted(
        placed(PLACEMENT.ROTOR_ID.eq(rotorId))
            .map(
                row -> {
                  Long piece = row.get(PLACEMENT.PIECE_ID);
                  return link(
                      row,
                      piece == null ? things.of(row.get(PLACEMENT.LOT_ID)) : things.piece(piece));
                }));
  }

  private List<Link> inTray(long trayId) {
    return sql
        .select(CELL_CONTENT.PIECE_ID)
        .from(CELL_CONTENT)
        .where(CELL_CONTENT.TRAY_ID.eq(trayId))
        .orderBy(CELL_CONTENT.PIECE_ID)
        .fetch(CELL_CONTENT.PIECE_ID)
        .stream()
        .map(piece -> Link.always(things.piece(piece)))
        .toList();
  }

  private List<Link> placements(Condition condition) {
    return counted(placed(condition).map(row -> link(row, things.of(row.get(PLACEMENT.ROTOR_ID)))));
  }

  private org.jooq.Result<Record> placed(Condition condition) {
    return sql.select()
        .from(PLACEMENT)
        .leftJoin(PLACEMENT_END)
        .on(PLACEMENT_END.PLACEMENT_ID.eq(PLACEMENT.ID))
        .where(condition.and(PLACEMENT_END.KIND.isNull().or(PLACEMENT_END.KIND.ne("corrected"))))
        .orderBy(PLACEMENT.SLOT, PLACEMENT.ID)
        .fetch();
  }

  private static Link link(Record row, Thing thing) {
    return new Link(
        thing,
        row.get(PLACEMENT.STATED_AT),
        row.get(PLACEMENT_END.STATED_AT),
        row.get(PLACEMENT.PIECE_ID) == null ? 1 : null);
  }

  /// The unmeasured magnets of one lot in one rotor, until the same time, as one link from the
  /// earliest time on.
  private static List<Link> counted(List<Link> links) {
    Map<Link, Link> together = new LinkedHashMap<>();
    for (Link link : links) {
      boolean counts = link.magnets() != null;
      together.merge(
          counts ? new Link(link.thing(), null, link.to(), 0) : link, link, Links::together);
    }
    return List.copyOf(together.values());
  }

  private static Link together(Link one, Link other) {
    if (one.magnets() == null || other.magnets() == null) {
      return one;
    }
    Instant from = one.from();
    Instant since = other.from();
    boolean earlier = from != null && since != null && since.isBefore(from);
    return new Link(one.thing(), earlier ? since : from, one.to(), one.magnets() + other.magnets());
  }
}
