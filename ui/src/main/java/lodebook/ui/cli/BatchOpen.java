package lodebook.ui.cli;

import java.util.List;
import lodebook.db.builds.Batch;
import lodebook.db.builds.Batches;
import lodebook.db.builds.Rotor;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Opens a batch of gears.
@Command(
    name = "open",
    description = "Open a batch of gears: its rotors get their numbers.",
    footer = {
      "",
      "Example:",
      "  lodebook batch open B-31 --gear STIR --count 2 --serials 'R-{0001}'"
    })
final class BatchOpen extends Verb {
  @Parameters(paramLabel = "BATCH", description = "its number")
  private String code = "";

  @Option(names = "--gear", paramLabel = "GEAR", required = true, description = "a released model")
  private String gear = "";

  @Option(names = "--count", paramLabel = "N", required = true, description = "how many gears")
  private int count;

  @Option(
      names = "--serials",
      paramLabel = "PATTERN",
      description = "pattern of the rotors' numbers (default BATCH-{0001})")
  private @Nullable String serials;

  BatchOpen(Session session) {
    super(session);
  }

  @Override
  int run() {
    Batch batch =
        session.write(book -> new Batches(book).open(session.act(), code, gear, count, serials));
    List<String> rotors = batch.rotors().stream().map(Rotor::code).toList();
    session.done("batch.opened", batch.code(), batch.gears(), String.join(", ", rotors));
    session.next("lodebook plan --batch " + batch.code() + " --from LOT");
    return 0;
  }
}
