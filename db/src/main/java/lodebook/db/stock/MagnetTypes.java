package lodebook.db.stock;

import static lodebook.db.tables.Tables.GRADE;
import static lodebook.db.tables.Tables.MAGNET_TYPE;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.code.CodeText;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RowProblem;
import lodebook.db.refusal.RowsRefused;
import lodebook.db.rights.Permission;
import org.jooq.DSLContext;
import org.jooq.Record;

/// Magnet types. A type never changes: another dimension is a type of another name.
public final class MagnetTypes {
  private final Book book;

  /// The types of a book.
  public MagnetTypes(Book book) {
    this.book = book;
  }

  /// Takes in new types, all or none. A recoil permeability of 0 takes the grade's.
  public void importTypes(Act act, List<MagnetType> types) {
    book.run(
        act,
        Permission.DESIGN,
        "type import",
        writing -> {
          Map<String, GradeOfType> grades = new HashMap<>();
          writing
              .sql()
              .select(GRADE.FOLDED, GRADE.ID, GRADE.RECOIL_PERMEABILITY)
              .from(GRADE)
              .forEach(r -> grades.put(r.value1(), new GradeOfType(r.value2(), r.value3())));
          check(writing.sql(), types, grades.keySet());
          for (MagnetType type : types) {
            GradeOfType grade = grades.get(CodeText.fold(type.grade()));
            if (grade == null) {
              throw new IllegalStateException(type.grade());
            }
            insert(writing, type, grade);
          }
        });
  }

  private record GradeOfType(long id, double recoilPermeability) {}

  private static void check(DSLContext sql, List<MagnetType> types, Set<String> grades) {
    Set<String> known =
        new HashSet<>(sql.select(MAGNET_TYPE.FOLDED).from(MAGNET_TYPE).fetch(MAGNET_TYPE.FOLDED));
    List<RowProblem> problems = new ArrayList<>();
    Set<String> inFile = new HashSet<>();
    for (int row = 0; row < types.size(); row++) {
      MagnetType type = types.get(row);
      String folded = CodeText.fold(type.code());
      if (!inFile.add(folded)) {
        problems.add(new RowProblem(row, "type", Refusal.wrongInput("type.twice", type.code())));
      } else if (known.contains(folded)) {
        problems.add(
            new RowProblem(
                row,
                "type",
                Refusal.refused("type.taken", type.code()).remedy("lodebook type list")));
      }
      if (!grades.contains(CodeText.fold(type.grade()))) {
        problems.add(
            new RowProblem(
                row,
                "grade",
                Refusal.refused("grade.unknown", type.grade()).remedy("lodebook grade list")));
      }
    }
    RowsRefused.throwIfAny(problems);
  }

  private static void insert(Writing writing, MagnetType type, GradeOfType grade) {
    double recoil =
        type.recoilPermeability() == 0 ? grade.recoilPermeability() : type.recoilPermeability();
    writing
        .sql()
        .insertInto(MAGNET_TYPE)
        .set(MAGNET_TYPE.ID, writing.newId())
        .set(MAGNET_TYPE.FOLDED, CodeText.fold(type.code()))
        .set(MAGNET_TYPE.NAME, type.code())
        .set(MAGNET_TYPE.SHAPE, type.shape().name().toLowerCase(Locale.ROOT))
        .set(MAGNET_TYPE.THICKNESS_METRES, type.thicknessMetres())
        .set(MAGNET_TYPE.WIDTH_METRES, type.widthMetres())
        .set(MAGNET_TYPE.LENGTH_METRES, type.lengthMetres())
        .set(MAGNET_TYPE.DIAMETER_METRES, type.diameterMetres())
        .set(MAGNET_TYPE.INNER_DIAMETER_METRES, type.innerDiameterMetres())
        .set(MAGNET_TYPE.ARC_DEGREES, type.arcDegrees())
        .set(MAGNET_TYPE.GRADE_ID, grade.id())
        .set(MAGNET_TYPE.TOLERANCE_METRES, type.toleranceMetres())
        .set(MAGNET_TYPE.COATING, type.coating())
        .set(MAGNET_TYPE.RECOIL_PERMEABILITY, recoil)
        .set(MAGNET_TYPE.MAGNETISATION_DEGREES, type.magnetisationDegrees())
        .set(MAGNET_TYPE.RECORDED_AT, writing.recordedAt())
        .set(MAGNET_TYPE.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    writing
        .line()
        .row(
            List.of(
                type.code(),
                type.shape().name().toLowerCase(Locale.ROOT),
                String.valueOf(type.thicknessMetres()),
                String.valueOf(type.widthMetres()),
                String.valueOf(type.lengthMetres()),
                String.valueOf(type.diameterMetres()),
                String.valueOf(type.innerDiameterMetres()),
                String.valueOf(type.arcDegrees()),
                type.grade(),
                String.valueOf(type.toleranceMetres()),
                type.coating(),
                String.valueOf(recoil),
                String.valueOf(type.magnetisationDegrees())));
  }

  /// All types by name.
  public List<MagnetType> list() {
    return book.read(
        sql ->
            all(sql).values().stream()
                .sorted(Comparator.comparing(t -> CodeText.fold(t.code())))
                .toList());
  }

  /// All types by id, inside a transaction.
  public static Map<Long, MagnetType> all(DSLContext sql) {
    Map<Long, MagnetType> types = new HashMap<>();
    sql.select(MAGNET_TYPE.asterisk(), GRADE.NAME.as("grade_name"))
        .from(MAGNET_TYPE)
        .join(GRADE)
        .on(GRADE.ID.eq(MAGNET_TYPE.GRADE_ID))
        .forEach(r -> types.put(r.get(MAGNET_TYPE.ID), type(r)));
    return types;
  }

  private static MagnetType type(Record r) {
    return new MagnetType(
        r.get(MAGNET_TYPE.NAME),
        Shape.valueOf(r.get(MAGNET_TYPE.SHAPE).toUpperCase(Locale.ROOT)),
        r.get(MAGNET_TYPE.THICKNESS_METRES),
        r.get(MAGNET_TYPE.WIDTH_METRES),
        r.get(MAGNET_TYPE.LENGTH_METRES),
        r.get(MAGNET_TYPE.DIAMETER_METRES),
        r.get(MAGNET_TYPE.INNER_DIAMETER_METRES),
        r.get(MAGNET_TYPE.ARC_DEGREES),
        r.get("grade_name", String.class),
        r.get(MAGNET_TYPE.TOLERANCE_METRES),
        r.get(MAGNET_TYPE.COATING),
        r.get(MAGNET_TYPE.RECOIL_PERMEABILITY),
        r.get(MAGNET_TYPE.MAGNETISATION_DEGREES));
  }
}
