package lodebook.db.surveys;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.METER;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PIECE_READING;
import static lodebook.db.tables.Tables.PLACEMENT;
import static org.jooq.impl.DSL.max;

import java.util.HashMap;
import java.util.Map;
import lodebook.assembly.magnet.LotStrength;
import lodebook.assembly.magnet.Strength;
import lodebook.assembly.survey.PlacedMagnet;
import lodebook.assembly.survey.SharedDoubt;
import lodebook.db.builds.LotStrengths;
import lodebook.db.builds.LotStrengths.OfLot;
import lodebook.db.builds.RecordedPlacement;
import org.jooq.DSLContext;
import org.jooq.Record;
import org.jspecify.annotations.Nullable;

/// How strong the magnets of placements are believed to be, and which doubt they share.
///
/// Pieces measured with one meter share its gain error; unmeasured magnets of a lot share the doubt
/// about the lot's mean.
final class Strengths {
  /// Relative gain error where a piece was read without a named meter.
  private static final double NO_METER = 0.01;

  private final Map<Long, PlacedMagnet> byPlacement = new HashMap<>();

  Strengths(DSLContext sql, long rotorId) {
    Map<Long, String> gauges = new HashMap<>();
    Map<Long, Double> accuracies = new HashMap<>();
    loadGauges(sql, rotorId, gauges, accuracies);
    LotStrengths lots = new LotStrengths(sql);
    sql.select()
        .from(PLACEMENT)
        .join(CODE)
        .on(CODE.ID.eq(PLACEMENT.LOT_ID))
        .leftJoin(PIECE)
        .on(PIECE.ID.eq(PLACEMENT.PIECE_ID))
        .where(PLACEMENT.ROTOR_ID.eq(rotorId))
        .forEach(
            row -> {
              OfLot lot = lots.of(row.get(PLACEMENT.LOT_ID));
              byPlacement.put(
                  row.get(PLACEMENT.ID),
                  row.get(PIECE.REMANENCE_TESLA) == null
                      ? unmeasured(row.get(CODE.SHOWN), lot)
                      : measured(row, lot, gauges, accuracies));
            });
  }

  private static void loadGauges(
      DSLContext sql, long rotorId, Map<Long, String> gauges, Map<Long, Double> accuracies) {
    sql.select()
        .from(PIECE_READING)
        .join(METER)
        .on(METER.ID.eq(PIECE_READING.METER_ID))
        .join(CODE)
        .on(CODE.ID.eq(METER.ID))
        .where(
            PIECE_READING.ID.in(
                sql.select(max(PIECE_READING.ID))
                    .from(PIECE_READING)
                    .join(PLACEMENT)
                    .on(PLACEMENT.PIECE_ID.eq(PIECE_READING.PIECE_ID))
                    .where(PLACEMENT.ROTOR_ID.eq(rotorId))
                    .groupBy(PIECE_READING.PIECE_ID)))
        .forEach(
            row -> {
              gauges.put(row.get(PIECE_READING.PIECE_ID), row.get(CODE.SHOWN));
              accuracies.put(row.get(PIECE_READING.PIECE_ID), row.get(METER.ACCURACY_RELATIVE));
            });
  }

  private static PlacedMagnet unmeasured(String code, OfLot lot) {
    LotStrength strength = lot.strength();
    return new PlacedMagnet(
        strength.ofOne(),
        lot.remanencePerKelvin(),
        new SharedDoubt("lot " + code, strength.doubtTesla()));
  }

  private static PlacedMagnet measured(
      Record row, OfLot lot, Map<Long, String> gauges, Map<Long, Double> accuracies) {
    long piece = row.get(PIECE.ID);
    double remanence = row.get(PIECE.REMANENCE_TESLA);
    double whole = row.get(PIECE.REMANENCE_UNCERTAINTY_TESLA);
    @Nullable String gauge = gauges.get(piece);
    double shared = Math.min(whole, accuracies.getOrDefault(piece, NO_METER) * remanence);
    double own = Math.sqrt(whole * whole - shared * shared);
    return new PlacedMagnet(
        new Strength(remanence, own),
        lot.remanencePerKelvin(),
        new SharedDoubt(gauge == null ? "no meter" : "meter " + gauge, shared));
  }

  /// The magnets of placements by slot.
  Map<Integer, PlacedMagnet> of(Map<Integer, RecordedPlacement> standing) {
    Map<Integer, PlacedMagnet> magnets = new HashMap<>();
    for (Map.Entry<Integer, RecordedPlacement> each : standing.entrySet()) {
      magnets.put(each.getKey(), of(each.getValue()));
    }
    return magnets;
  }

  private PlacedMagnet of(RecordedPlacement placement) {
    PlacedMagnet magnet = byPlacement.get(placement.id());
    if (magnet == null) {
      throw new IllegalStateException("placement " + placement.id() + " is of another rotor");
    }
    return magnet;
  }
}
