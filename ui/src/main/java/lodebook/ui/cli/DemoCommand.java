package lodebook.ui.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.magnet.Strength;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.builds.Rotors;
import lodebook.db.refusal.Refusal;
import lodebook.db.stock.PieceName;
import lodebook.db.stock.Pieces;
import lodebook.ui.demo.Demo;
import lodebook.ui.demo.Runner;
import lodebook.ui.demo.Workbench;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/// Makes a demo book and walks the main job on it.
@Command(
    name = "demo",
    description = "Make a demo book of an invented workshop and walk the whole job on it.",
    footer = {"", "Example:", "  lodebook demo --into demo"})
final class DemoCommand extends Verb {
  @Option(
      names = "--into",
      paramLabel = "FOLDER",
      description = "a new or empty folder (else one made for it among temporary files)")
  private @Nullable Path into;

  DemoCommand(Session session) {
    super(session);
  }

  @Override
  int run() {
    Path folder = folder();
    Map<String, String> env = new HashMap<>(session.around().env());
    env.put("LODEBOOK_BOOK", folder.resolve("book").toString());
    env.put("LODEBOOK_BY", "MK");
    new Demo(words -> run(env, words), workbench(folder), session.around().out()::println, folder)
        .walk();
    session.tell("demo.where", folder.resolve("book"));
    session.around().out().println(folder);
    return 0;
  }

  private Path folder() {
    try {
      if (into == null) {
        return Files.createTempDirectory("lodebook-demo-");
      }
      Path folder = into.toAbsolutePath().normalize();
      if (Files.exists(folder) && (!Files.isDirectory(folder) || !isEmpty(folder))) {
        throw Refusal.refused("demo.not-empty", into).remedy("lodebook demo --into NEW-FOLDER");
      }
      return Files.createDirectories(folder);
    } catch (IOException failed) {
      throw new Failures.CannotWrite(into == null ? Path.of("lodebook-demo") : into, failed);
    }
  }

  private static boolean isEmpty(Path folder) throws IOException {
    try (Stream<Path> inside = Files.list(folder)) {
      return inside.findAny().isEmpty();
    }
  }

  private Runner.Answer run(Map<String, String> env, List<String> words) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    int code =
        Lodebook.run(
            words,
            env,
            new PrintStream(out, true, StandardCharsets.UTF_8),
            new PrintStream(err, true, StandardCharsets.UTF_8),
            session.around().clock());
    return new Runner.Answer(
        code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
  }

  private Workbench workbench(Path folder) {
    BookAddress address = new BookAddress.Folder(folder.resolve("book"));
    return new Workbench() {
      @Override
      public RingDesign design(String rotor) {
        try (Book book = Book.open(address, session.visit())) {
          return new Rotors(book).show(rotor).design();
        }
      }

      @Override
      public double[] remanencesTesla(List<String> pieces) {
        try (Book book = Book.open(address, session.visit())) {
          Pieces stock = new Pieces(book);
          return pieces.stream()
              .mapToDouble(
                  piece -> {
                    Strength strength = stock.show(PieceName.of(piece)).strength();
                    if (strength == null) {
                      throw new IllegalStateException(piece + " was not measured");
                    }
                    return strength.remanenceTesla();
                  })
              .toArray();
        }
      }
    };
  }
}
