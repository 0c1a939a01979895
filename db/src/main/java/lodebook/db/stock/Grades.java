package lodebook.db.stock;

import static lodebook.db.tables.Tables.GRADE;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import lodebook.assembly.magnet.Grade;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.code.CodeText;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RowProblem;
import lodebook.db.refusal.RowsRefused;
import lodebook.db.rights.Permission;
import lodebook.db.tables.tables.records.GradeRecord;

/// Magnet materials. A grade never changes: a better figure is a grade of another name.
public final class Grades {
  private final Book book;

  /// The grades of a book.
  public Grades(Book book) {
    this.book = book;
  }

  /// Takes in new grades, all or none.
  public void importGrades(Act act, List<Grade> grades) {
    book.run(act, Permission.DESIGN, "grade import", writing -> insert(writing, grades));
  }

  /// Stores grades inside a transaction.
  public static void insert(Writing writing, List<Grade> grades) {
    Set<String> known =
        new HashSet<>(writing.sql().select(GRADE.FOLDED).from(GRADE).fetch(GRADE.FOLDED));
    List<RowProblem> problems = new ArrayList<>();
    Set<String> inFile = new HashSet<>();
    for (int row = 0; row < grades.size(); row++) {
      String name = grades.get(row).name();
      String folded = CodeText.fold(name);
      if (!inFile.add(folded)) {
        problems.add(new RowProblem(row, "grade", Refusal.wrongInput("grade.twice", name)));
      } else if (known.contains(folded)) {
        problems.add(
            new RowProblem(
                row, "grade", Refusal.refused("grade.taken", name).remedy("lodebook grade list")));
      }
    }
    RowsRefused.throwIfAny(problems);
    for (Grade grade : grades) {
      insert(writing, grade);
    }
  }

  private static void insert(Writing writing, Grade grade) {
    writing
        .sql()
        .insertInto(GRADE)
        .set(GRADE.ID, writing.newId())
        .set(GRADE.FOLDED, CodeText.fold(grade.name()))
        .set(GRADE.NAME, grade.name())
        .set(GRADE.REMANENCE_LOW_TESLA, grade.remanenceLowTesla())
        .set(GRADE.REMANENCE_HIGH_TESLA, grade.remanenceHighTesla())
        .set(GRADE.REMANENCE_PER_KELVIN, grade.remanencePerKelvin())
        .set(GRADE.RECOIL_PERMEABILITY, grade.recoilPermeability())
        .set(GRADE.HIGHEST_TEMPERATURE_CELSIUS, grade.highestTemperatureCelsius())
        .set(GRADE.DENSITY_KILOGRAM_PER_CUBIC_METRE, grade.densityKilogramPerCubicMetre())
        .set(GRADE.SOURCE, grade.source())
        .set(GRADE.RECORDED_AT, writing.recordedAt())
        .set(GRADE.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    writing
        .line()
        .row(
            List.of(
                grade.name(),
                String.valueOf(grade.remanenceLowTesla()),
                String.valueOf(grade.remanenceHighTesla()),
                String.valueOf(grade.remanencePerKelvin()),
                String.valueOf(grade.recoilPermeability()),
                String.valueOf(grade.highestTemperatureCelsius()),
                String.valueOf(grade.densityKilogramPerCubicMetre()),
                grade.source()));
  }

  /// All grades by name.
  public List<Grade> list() {
    return book.read(
        sql ->
            sql.selectFrom(GRADE).fetch(Grades::grade).stream()
                .sorted(Comparator.comparing(g -> CodeText.fold(g.name())))
                .toList());
  }

  static Grade grade(GradeRecord row) {
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
