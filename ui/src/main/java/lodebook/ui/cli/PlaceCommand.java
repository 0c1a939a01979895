package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.db.builds.PlaceHow;
import lodebook.db.builds.PlaceRow;
import lodebook.db.builds.Placed;
import lodebook.db.builds.Placements;
import lodebook.ui.files.Example;
import lodebook.ui.files.PlacementFile;
import lodebook.ui.files.Rows;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Records what was really put where.
@Command(
    name = "place",
    description = "Record what was really put where in a rotor.",
    footer = {"", "Example:", "  lodebook place R-0001 placements.csv"})
final class PlaceCommand extends FileVerb {
  @Parameters(index = "0", arity = "0..1", paramLabel = "ROTOR", description = "its number")
  private @Nullable String rotor;

  @Parameters(index = "1", arity = "0..1", paramLabel = "FILE", description = "a CSV file")
  private @Nullable Path file;

  @Option(names = "--correct", description = "the record was wrong from the start (needs --why)")
  private boolean correct;

  @Option(names = "--rework", description = "the magnet was changed from now on (needs --why)")
  private boolean rework;

  @Option(names = "--deviation", description = "a facing off the layout is meant so (needs --why)")
  private boolean deviation;

  @Option(names = "--why", paramLabel = "TEXT", description = "the reason")
  private @Nullable String why;

  PlaceCommand(Session session) {
    super(session, Example.PLACEMENTS);
  }

  @Override
  int takeIn() {
    String code = need(rotor, "ROTOR");
    Path path = need(file, "FILE");
    if (correct && rework) {
      throw wrongLine("line.not-both", "--correct", "--rework");
    }
    String reason = correct || rework || deviation ? need(why, "--why TEXT") : "";
    PlaceHow.Change change =
        correct ? PlaceHow.Change.CORRECT : rework ? PlaceHow.Change.REWORK : PlaceHow.Change.NONE;
    Rows<PlaceRow> rows = PlacementFile.read(session.source(path));
    importing(
        rows,
        () ->
            session.change(
                book ->
                    tell(
                        new Placements(book)
                            .place(
                                session.act(),
                                code,
                                rows.all(),
                                new PlaceHow(change, deviation, reason)))));
    session.next("lodebook survey import " + code + " survey.csv --meter METER");
    return 0;
  }

  private void tell(Placed placed) {
    session.done("placed", placed.slots().size(), placed.rotor(), placed.filled(), placed.of());
    if (!placed.takenOut().isEmpty()) {
      session.warn(session.words().say("placed.out", String.join(", ", placed.takenOut())));
    }
  }
}
