package lodebook.db.builds;

import static lodebook.db.tables.Tables.GRADE;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.MAGNET_TYPE;
import static lodebook.db.tables.Tables.PIECE;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.LotStrength;
import lodebook.assembly.magnet.Strength;
import lodebook.db.tables.tables.records.GradeRecord;
import org.jooq.DSLContext;

/// What is believed of unmeasured magnets, lot by lot, inside a transaction.
public final class LotStrengths {
  private final DSLContext sql;
  private final Map<Long, OfLot> known = new HashMap<>();

  /// What a lot's magnets have in common.
  ///
  /// @param strength mean, spread and doubt
  /// @param remanencePerKelvin relative change of the remanence per kelvin
  public record OfLot(LotStrength strength, double remanencePerKelvin) {}

  /// Looks lots up as they are asked for.
  public LotStrengths(DSLContext sql) {
    this.sql = sql;
  }

  /// What is believed of a lot's unmeasured magnets.
  public OfLot of(long lotId) {
    return known.computeIfAbsent(lotId, this::load);
  }

  private OfLot load(long lotId) {
    List<Strength> measured =
        sql.select(PIECE.REMANENCE_TESLA, PIECE.REMANENCE_UNCERTAINTY_TESLA)
            .from(PIECE)
            .where(PIECE.LOT_ID.eq(lotId).and(PIECE.REMANENCE_TESLA.isNotNull()))
            .orderBy(PIECE.NUMBER)
            .fetch(row -> new Strength(row.value1(), row.value2()));
    return sql.select()
        .from(LOT)
        .join(MAGNET_TYPE)
        .on(MAGNET_TYPE.ID.eq(LOT.TYPE_ID))
        .join(GRADE)
        .on(GRADE.ID.eq(MAGNET_TYPE.GRADE_ID))
        .where(LOT.ID.eq(lotId))
        .fetchSingle(
            row -> {
              Grade grade = grade(row.into(GRADE));
              return new OfLot(
                  LotStrength.of(measured, row.get(LOT.CERTIFICATE_REMANENCE_TESLA), grade),
                  grade.remanencePerKelvin());
            });
  }

  private static Grade grade(GradeRecord row) {
    return new Grade(
        row.getName(),
        row.getRemanenceLowTesla(),
        row.getRemanenceHighTesla(),
        row.getRemanencePerKelvin(),
        row.getRecoilPermeability(),
        row.getHighestTemperatureCelsius(),
        row.getDensityKilogramPerCubicMetre(),
        row.getSource());
  }
}
