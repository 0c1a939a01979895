package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.db.refusal.RowsRefused;
import lodebook.ui.files.Example;
import lodebook.ui.files.Placed;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;

/// A command that reads a file of the shop, and can write an example of it.
abstract class FileVerb extends Verb {
  private final Example example;

  @Option(
      names = "--example",
      paramLabel = "FILE",
      description = "write a filled-in example to FILE and stop")
  @Nullable Path exampleFile;

  FileVerb(Session session, Example example) {
    super(session);
    this.example = example;
  }

  /// Reads the file and does the work.
  abstract int takeIn();

  @Override
  final int run() {
    if (exampleFile == null) {
      return takeIn();
    }
    OutputFile.write(exampleFile, example.text());
    session.tell("example.written", exampleFile);
    return 0;
  }

  /// A parameter that must be there where no example is asked for.
  <T> T need(@Nullable T given, String label) {
    if (given == null) {
      throw wrongLine("line.missing", label);
    }
    return given;
  }

  /// Does something with what a file holds; what the book refuses is told at its place.
  void importing(Placed read, Runnable work) {
    try {
      work.run();
    } catch (RowsRefused refused) {
      throw FileRefused.of(refused, read, session);
    }
  }
}
