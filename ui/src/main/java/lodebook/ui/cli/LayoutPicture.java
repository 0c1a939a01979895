package lodebook.ui.cli;

import java.nio.file.Path;
import java.util.Locale;
import lodebook.db.book.Book;
import lodebook.db.builds.RotorShown;
import lodebook.db.builds.Rotors;
import lodebook.db.layouts.LayoutRevision;
import lodebook.db.layouts.Layouts;
import lodebook.db.refusal.Refusal;
import lodebook.reports.ring.RingFiles;
import lodebook.reports.ring.RingPicture;
import lodebook.reports.sheet.SheetFacts;
import lodebook.ui.paper.Facts;
import lodebook.ui.paper.RingPictures;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Draws the ring of a layout or of a rotor.
@Command(
    name = "picture",
    description = "Draw the ring of a layout or of a rotor as PNG, SVG or PDF.",
    footer = {"", "Example:", "  lodebook layout picture STIR-IN --kind ring -o ring.png"})
final class LayoutPicture extends Verb {
  @Parameters(paramLabel = "CODE", description = "a layout or a rotor")
  private String code = "";

  @Option(names = "--kind", description = "ring (default)")
  private String kind = "ring";

  @Option(
      names = {"-o", "--output"},
      paramLabel = "FILE",
      required = true,
      description = "the file: .png, .svg or .pdf")
  private Path file = Path.of("ring.png");

  LayoutPicture(Session session) {
    super(session);
  }

  @Override
  int run() {
    if (!kind.equals("ring")) {
      throw wrongLine("line.not-one-of", "--kind", kind, "ring");
    }
    String name = file.toString().toLowerCase(Locale.ROOT);
    if (!name.matches(".*\\.(png|svg|pdf)")) {
      throw wrongLine("line.not-one-of", "-o", file, "*.png, *.svg, *.pdf");
    }
    byte[] bytes = session.read(book -> draw(book, name));
    OutputFile.write(file, bytes);
    session.done("picture.written", file);
    return 0;
  }

  private byte[] draw(Book book, String name) {
    Locale language = session.words().locale();
    RotorShown rotor = rotor(book);
    LayoutRevision layout = rotor == null ? new Layouts(book).show(code) : null;
    RingPicture picture =
        rotor == null
            ? RingPictures.of(new Layouts(book).design(code), language)
            : RingPictures.of(rotor, language);
    if (name.endsWith(".png")) {
      return RingFiles.png(picture);
    }
    if (name.endsWith(".svg")) {
      return RingFiles.svg(picture);
    }
    Facts facts = session.facts(book);
    SheetFacts sheet =
        layout == null
            ? facts.of(code, picture.layout().name())
            : facts.of(layout.layout().code(), LayoutShow.shown(layout.layout()));
    return RingFiles.pdf(picture, sheet);
  }

  /// The rotor of that number, or null where it is none.
  private @Nullable RotorShown rotor(Book book) {
    try {
      return new Rotors(book).show(code);
    } catch (Refusal other) {
      if (other.notice().key().startsWith("rotor.")) {
        return null;
      }
      throw other;
    }
  }
}
