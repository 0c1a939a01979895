package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.db.stock.ImportedReadings;
import lodebook.db.stock.Lot;
import lodebook.db.stock.LotState;
import lodebook.db.stock.Lots;
import lodebook.db.stock.PieceImport;
import lodebook.db.stock.ReadingRow;
import lodebook.ui.files.Example;
import lodebook.ui.files.PieceReadingFile;
import lodebook.ui.files.Rows;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Takes in gaussmeter readings of single pieces.
@Command(
    name = "import",
    description = "Take in gaussmeter readings of the pieces of a lot.",
    footer = {"", "Example:", "  lodebook piece import L-2404 readings.csv"})
final class PieceTakeIn extends FileVerb {
  @Parameters(index = "0", arity = "0..1", paramLabel = "LOT", description = "number of the lot")
  private @Nullable String lot;

  @Parameters(index = "1", arity = "0..1", paramLabel = "FILE", description = "a CSV file")
  private @Nullable Path file;

  @Option(
      names = "--again",
      description = "take in readings that are in the book already once more (needs --why)")
  private boolean again;

  @Option(names = "--why", paramLabel = "TEXT", description = "the reason for --again")
  private @Nullable String why;

  PieceTakeIn(Session session) {
    super(session, Example.READINGS);
  }

  @Override
  int takeIn() {
    String of = need(lot, "LOT");
    Path path = need(file, "FILE");
    String reason = again ? need(why, "--why TEXT") : null;
    Rows<ReadingRow> rows = PieceReadingFile.read(session.source(path), of, again);
    importing(
        rows,
        () ->
            session.change(
                book -> {
                  tell(new PieceImport(book).importReadings(session.act(), of, rows.all(), reason));
                  next(new Lots(book).show(of));
                }));
    return 0;
  }

  private void next(Lot lot) {
    String code = lot.code();
    session.next(
        lot.state() == LotState.AWAITING
            ? "lodebook lot accept " + code + " --why TEXT"
            : "lodebook lot show " + code);
  }

  private void tell(ImportedReadings taken) {
    session.done("piece.imported", taken.readings(), taken.pieces(), taken.newPieces());
    if (taken.withoutMeter() > 0) {
      session.warn(session.words().say("piece.without-meter", taken.withoutMeter()));
    }
    if (taken.withoutTemperature() > 0) {
      session.warn(session.words().say("piece.without-temperature", taken.withoutTemperature()));
    }
  }
}
