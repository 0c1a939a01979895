package lodebook.ui.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import lodebook.db.book.Book;
import lodebook.db.builds.RotorShown;
import lodebook.db.builds.Rotors;
import lodebook.db.layouts.LayoutRevision;
import lodebook.db.layouts.Layouts;
import lodebook.db.refusal.Refusal;
import lodebook.reports.film.PictureFiles;
import lodebook.reports.ring.RingFiles;
import lodebook.reports.ring.RingPicture;
import lodebook.reports.sheet.SheetFacts;
import lodebook.reports.words.Words;
import lodebook.ui.paper.Facts;
import lodebook.ui.paper.RingPictures;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Draws the ring of a layout or of a rotor.
@Command(
    name = "picture",
    description = {
      "Draw a layout or a rotor as PNG, SVG or PDF: its ring, the radial flux round it with what was",
      "read, or what a viewing film shows on it, at true size, as planned and with each fault that",
      "the rotor's latest survey makes likely."
    },
    footer = {
      "",
      "Example:",
      "  lodebook layout picture STIR-IN --kind ring -o ring.png",
      "  lodebook layout picture R-0001 --kind film -o film.pdf"
    })
final class LayoutPicture extends Verb {
  private static final List<String> KINDS = List.of("ring", "field", "film");

  @Parameters(paramLabel = "CODE", description = "a layout or a rotor")
  private String code = "";

  @Option(names = "--kind", description = "ring (default), field or film")
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
    if (!KINDS.contains(kind)) {
      throw wrongLine("line.not-one-of", "--kind", kind, String.join(", ", KINDS));
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
    if (!kind.equals("ring")) {
      return computed(book, rotor, name);
    }
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

  private byte[] computed(Book book, @Nullable RotorShown rotor, String name) {
    Locale language = session.words().locale();
    DrawnRing ring =
        rotor == null ? DrawnRing.ofLayout(book, code) : DrawnRing.ofRotor(book, rotor);
    Words words = new Words(language);
    PictureFiles files =
        kind.equals("film")
            ? ring.film(words.say("film.title"), words.say("film.plan"), language)
            : ring.field(words.say("field.title"), language);
    if (name.endsWith(".png")) {
      return files.png();
    }
    return name.endsWith(".svg")
        ? files.svg()
        : files.pdf(session.facts(book).of(code, ring.design().layout().name()));
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
