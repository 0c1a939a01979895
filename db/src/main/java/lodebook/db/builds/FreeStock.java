package lodebook.db.builds;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LIVE_PLACEMENT;
import static lodebook.db.tables.Tables.LIVE_PLAN;
import static lodebook.db.tables.Tables.LIVE_SLOT;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.MAGNET_TYPE;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.PLANNED_PLACEMENT;
import static lodebook.db.tables.Tables.RESERVED_PIECE;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Objects;
import lodebook.assembly.magnet.Strength;
import lodebook.assembly.plan.Candidate;
import lodebook.assembly.plan.Kept;
import lodebook.assembly.plan.LotSupply;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jooq.impl.DSL;

/// Magnets that a plan may use, inside a transaction.
final class FreeStock {
  private final DSLContext sql;
  private final Collection<Long> rotors;

  /// @param rotors the rotors that are planned; what their own plans keep is free for them
  FreeStock(DSLContext sql, Collection<Long> rotors) {
    this.sql = sql;
    this.rotors = rotors;
  }

  /// Measured pieces of a lot that are usable, stand nowhere and are kept by no other rotor's plan.
  List<Candidate> pieces(long lotId) {
    return sql.select()
        .from(PIECE)
        .join(LOT)
        .on(LOT.ID.eq(PIECE.LOT_ID))
        .join(CODE)
        .on(CODE.ID.eq(LOT.ID))
        .join(MAGNET_TYPE)
        .on(MAGNET_TYPE.ID.eq(LOT.TYPE_ID))
        .where(
            PIECE
                .LOT_ID
                .eq(lotId)
                .and(PIECE.STATE.eq("usable"))
                .and(PIECE.REMANENCE_TESLA.isNotNull())
                .and(PIECE.ID.notIn(DSL.select(LIVE_PLACEMENT.PIECE_ID).from(LIVE_PLACEMENT)))
                .and(PIECE.ID.notIn(keptByOthers())))
        .orderBy(PIECE.NUMBER)
        .fetch(
            row ->
                new Candidate(
                    MagnetName.shown(row.get(CODE.SHOWN), row.get(PIECE.NUMBER)),
                    row.get(CODE.SHOWN),
                    row.get(MAGNET_TYPE.NAME),
                    new Strength(
                        row.get(PIECE.REMANENCE_TESLA),
                        row.get(PIECE.REMANENCE_UNCERTAINTY_TESLA))));
  }

  private org.jooq.Select<org.jooq.Record1<Long>> keptByOthers() {
    return DSL.select(RESERVED_PIECE.PIECE_ID)
        .from(RESERVED_PIECE)
        .join(LIVE_PLAN)
        .on(LIVE_PLAN.PLAN_ID.eq(RESERVED_PIECE.PLAN_ID))
        .where(LIVE_PLAN.ROTOR_ID.notIn(rotors));
  }

  /// Unmeasured magnets of a lot that are free: all of the lot, less what is placed or scrapped,
  /// less measured or unusable pieces that stand nowhere, less what other rotors' plans count on.
  LotSupply unmeasured(long lotId) {
    int known =
        sql.fetchCount(
            PIECE,
            PIECE
                .LOT_ID
                .eq(lotId)
                .and(PIECE.STATE.ne("scrapped"))
                .and(PIECE.REMANENCE_TESLA.isNotNull().or(PIECE.STATE.ne("usable")))
                .and(PIECE.ID.notIn(DSL.select(LIVE_PLACEMENT.PIECE_ID).from(LIVE_PLACEMENT))));
    int planned =
        sql.fetchCount(
            sql.select(PLANNED_PLACEMENT.SLOT)
                .from(PLANNED_PLACEMENT)
                .join(LIVE_PLAN)
                .on(LIVE_PLAN.PLAN_ID.eq(PLANNED_PLACEMENT.PLAN_ID))
                .leftJoin(LIVE_SLOT)
                .on(
                    LIVE_SLOT
                        .ROTOR_ID
                        .eq(LIVE_PLAN.ROTOR_ID)
                        .and(LIVE_SLOT.SLOT.eq(PLANNED_PLACEMENT.SLOT)))
                .where(
                    PLANNED_PLACEMENT
                        .LOT_ID
                        .eq(lotId)
                        .and(PLANNED_PLACEMENT.PIECE_ID.isNull())
                        .and(LIVE_SLOT.SLOT.isNull())
                        .and(LIVE_PLAN.ROTOR_ID.notIn(rotors))));
    return sql.select()
        .from(LOT)
        .join(CODE)
        .on(CODE.ID.eq(LOT.ID))
        .join(MAGNET_TYPE)
        .on(MAGNET_TYPE.ID.eq(LOT.TYPE_ID))
        .where(LOT.ID.eq(lotId))
        .fetchSingle(
            row ->
                new LotSupply(
                    row.get(CODE.SHOWN),
                    row.get(MAGNET_TYPE.NAME),
                    (int)
                        Math.max(
                            0,
                            row.get(LOT.PIECE_COUNT)
                                - row.get(LOT.PLACED_COUNT)
                                - row.get(LOT.SCRAPPED_COUNT)
                                - known
                                - planned),
                    new LotStrengths(sql).of(lotId).strength().ofOne()));
  }

  /// What stands in a rotor, with strengths.
  List<Kept> kept(long rotorId) {
    LotStrengths lots = new LotStrengths(sql);
    List<Kept> kept = new ArrayList<>();
    Condition standing =
        PLACEMENT.ID.in(
            DSL.select(LIVE_SLOT.PLACEMENT_ID)
                .from(LIVE_SLOT)
                .where(LIVE_SLOT.ROTOR_ID.eq(rotorId)));
    for (RecordedPlacement each : PlacementRows.fetch(sql, standing)) {
      boolean piece = !each.magnet().equals(each.lot());
      kept.add(
          new Kept(
              each.slot(),
              piece ? each.magnet() : null,
              each.lot(),
              each.facing(),
              strength(each.id(), lots)));
    }
    return kept;
  }

  private Strength strength(long placementId, LotStrengths lots) {
    return Objects.requireNonNull(
        sql.select(PLACEMENT.LOT_ID, PIECE.REMANENCE_TESLA, PIECE.REMANENCE_UNCERTAINTY_TESLA)
            .from(PLACEMENT)
            .leftJoin(PIECE)
            .on(PIECE.ID.eq(PLACEMENT.PIECE_ID))
            .where(PLACEMENT.ID.eq(placementId))
            .fetchSingle(
                row ->
                    row.value2() == null
                        ? lots.of(row.value1()).strength().ofOne()
                        : new Strength(row.value2(), row.value3())));
  }
}
