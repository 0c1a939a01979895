package lodebook.ui.cli;

import java.util.List;
import lodebook.assembly.magnet.Grade;
import lodebook.db.stock.Grades;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;

/// Lists the grades.
@Command(
    name = "list",
    description = "List the grades that the book knows.",
    footer = {"", "Example:", "  lodebook grade list"})
final class GradeList extends Verb {

  GradeList(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<Grade> grades = session.read(book -> new Grades(book).list());
    Table table = new Table("GRADE", ">Br mT", ">Br %/K", ">RECOIL", ">MOST C", "SOURCE");
    grades.forEach(
        g ->
            table.row(
                g.name(),
                Amounts.fixed(g.remanenceLowTesla() * 1000, 0)
                    + "-"
                    + Amounts.fixed(g.remanenceHighTesla() * 1000, 0),
                Amounts.plain(g.remanencePerKelvin() * 100),
                Amounts.plain(g.recoilPermeability()),
                Amounts.plain(g.highestTemperatureCelsius()),
                g.source()));
    session.list(Json.list(grades.stream().map(GradeList::json).toList()), table, "grade.none");
    return 0;
  }

  private static Json json(Grade grade) {
    return Json.object()
        .put("grade", grade.name())
        .put("remanenceLowMilliTesla", grade.remanenceLowTesla() * 1000)
        .put("remanenceHighMilliTesla", grade.remanenceHighTesla() * 1000)
        .put("remanencePercentPerKelvin", grade.remanencePerKelvin() * 100)
        .put("recoilPermeability", grade.recoilPermeability())
        .put("highestTemperatureCelsius", grade.highestTemperatureCelsius())
        .put("densityKilogramPerCubicMetre", grade.densityKilogramPerCubicMetre())
        .put("source", grade.source());
  }
}
