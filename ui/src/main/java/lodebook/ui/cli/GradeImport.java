package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.assembly.magnet.Grade;
import lodebook.db.stock.Grades;
import lodebook.ui.files.Example;
import lodebook.ui.files.GradeFile;
import lodebook.ui.files.Rows;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Takes in grades.
@Command(
    name = "import",
    description = "Take in grades of magnet material.",
    footer = {"", "Example:", "  lodebook grade import grades.csv"})
final class GradeImport extends FileVerb {
  @Parameters(arity = "0..1", paramLabel = "FILE", description = "a CSV file")
  private @Nullable Path file;

  GradeImport(Session session) {
    super(session, Example.GRADES);
  }

  @Override
  int takeIn() {
    Rows<Grade> rows = GradeFile.read(session.source(need(file, "FILE")));
    importing(
        rows,
        () -> session.change(book -> new Grades(book).importGrades(session.act(), rows.all())));
    session.done("grade.imported", rows.count());
    session.next("lodebook type import types.csv");
    return 0;
  }
}
