package lodebook.db.layouts;

import static lodebook.db.tables.Tables.GRADE;
import static lodebook.db.tables.Tables.MAGNET_TYPE;

import java.util.Locale;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;
import lodebook.db.code.CodeText;
import lodebook.db.refusal.Refusal;
import lodebook.db.tables.tables.records.MagnetTypeRecord;
import org.jooq.DSLContext;

/// The magnet types that layouts name.
final class TypesOfLayouts {
  private TypesOfLayouts() {}

  /// The id of a type that a layout names; unknown types refuse.
  static long id(DSLContext sql, String layout, String type) {
    Long id =
        sql.select(MAGNET_TYPE.ID)
            .from(MAGNET_TYPE)
            .where(MAGNET_TYPE.FOLDED.eq(CodeText.fold(type)))
            .fetchOne(MAGNET_TYPE.ID);
    if (id == null) {
      throw Refusal.refused("layout.unknown-type", layout, type)
          .remedy("lodebook type import types.csv");
    }
    return id;
  }

  /// A known type by its name.
  static MagnetType type(DSLContext sql, String name) {
    return sql.select()
        .from(MAGNET_TYPE)
        .join(GRADE)
        .on(GRADE.ID.eq(MAGNET_TYPE.GRADE_ID))
        .where(MAGNET_TYPE.FOLDED.eq(CodeText.fold(name)))
        .fetchSingle(found -> type(found.into(MAGNET_TYPE), found.get(GRADE.NAME)));
  }

  private static MagnetType type(MagnetTypeRecord row, String grade) {
    return new MagnetType(
        row.getName(),
        Shape.valueOf(row.getShape().toUpperCase(Locale.ROOT)),
        row.getThicknessMetres(),
        row.getWidthMetres(),
        row.getLengthMetres(),
        row.getDiameterMetres(),
        row.getInnerDiameterMetres(),
        row.getArcDegrees(),
        grade,
        row.getToleranceMetres(),
        row.getCoating(),
        row.getRecoilPermeability(),
        row.getMagnetisationDegrees());
  }
}
