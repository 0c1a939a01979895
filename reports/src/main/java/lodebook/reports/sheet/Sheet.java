package lodebook.reports.sheet;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;
import lodebook.reports.canvas.PdfCanvas;
import lodebook.reports.canvas.Typeface;
import lodebook.reports.canvas.Wrap;
import lodebook.reports.words.Words;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.font.PDType0Font;

/// One sheet or several, of one or more pages each, as a PDF/A-2b file: a head on every page of a
/// sheet but its first, a foot on every page, pages counted sheet by sheet, the same bytes for the
/// same content.
public final class Sheet implements AutoCloseable {
  /// Margin left and right, millimetres.
  public static final double MARGIN = 15;

  /// Where the content of a page begins, millimetres from the paper's upper edge.
  public static final double TOP = 14;

  private static final double HEAD = 12;
  private static final double FOOT = 24;
  private static final Lettering SMALL = Lettering.plain(8.5).in(Palette.GRAPHITE);

  private final List<SheetFacts> sheets;
  private final Words words;
  private final String kind;
  private final Typeface typeface;
  private final PDDocument document = new PDDocument();
  private final PDFont plain;
  private final PDFont bold;
  private final List<List<PdfCanvas>> pages = new ArrayList<>();

  /// An empty sheet.
  ///
  /// @param kind what it is, in the reader's language, such as "Traveller"
  public Sheet(String kind, SheetFacts facts, Typeface typeface) {
    this(kind, List.of(facts), typeface);
  }

  /// Several empty sheets of one kind, language and paper; the first is begun.
  ///
  /// @param sheets what each says about itself, at least one
  public Sheet(String kind, List<SheetFacts> sheets, Typeface typeface) {
    this.kind = kind;
    this.sheets = List.copyOf(sheets);
    this.words = new Words(sheets.getFirst().language());
    pages.add(new ArrayList<>());
    this.typeface = typeface;
    try {
      plain = PDType0Font.load(document, typeface.file(false), true);
      bold = PDType0Font.load(document, typeface.file(true), true);
      String codes = String.join(", ", sheets.stream().map(SheetFacts::code).toList());
      ArchiveMetadata.write(document, kind + " " + codes, sheets.getFirst());
    } catch (IOException broken) {
      throw new UncheckedIOException(broken);
    }
  }

  /// The typeface of the sheet.
  public Typeface typeface() {
    return typeface;
  }

  /// Ends the sheet that was begun last and begins the next one.
  public void nextSheet() {
    pages.add(new ArrayList<>());
  }

  private SheetFacts facts() {
    return sheets.get(pages.size() - 1);
  }

  /// Begins a page; all but a sheet's first carry a head.
  ///
  /// @return the whole page, its origin at the paper's upper left corner
  public Canvas newPage() {
    var size =
        new PDRectangle(
            (float) (facts().paper().widthMillimetres() * 72 / 25.4),
            (float) (facts().paper().heightMillimetres() * 72 / 25.4));
    var page = new PDPage(size);
    document.addPage(page);
    try {
      var content = new PDPageContentStream(document, page);
      var canvas =
          new PdfCanvas(content, typeface, plain, bold, facts().paper().heightMillimetres());
      pages.getLast().add(canvas);
      if (pages.getLast().size() > 1) {
        head(canvas);
      }
      return canvas;
    } catch (IOException broken) {
      throw new UncheckedIOException(broken);
    }
  }

  /// Where content may begin on the page last begun, millimetres from the paper's upper edge.
  public double contentTop() {
    return pages.getLast().size() > 1 ? TOP + HEAD : TOP;
  }

  /// Where content must end, millimetres from the paper's upper edge.
  public double contentBottom() {
    return facts().paper().heightMillimetres() - FOOT;
  }

  /// Width of the content, millimetres.
  public double contentWidth() {
    return facts().paper().widthMillimetres() - 2 * MARGIN;
  }

  private double right() {
    return facts().paper().widthMillimetres() - MARGIN;
  }

  private void head(Canvas canvas) {
    SheetFacts facts = facts();
    String copy = facts.copy() > 1 ? words.say("sheet.copy", Integer.toString(facts.copy())) : "";
    double copyWidth = copy.isEmpty() ? 0 : typeface.width(copy, Lettering.bold(11)) + 4;
    String title = kind + " " + facts.code();
    Lettering lettering = Lettering.bold(13);
    while (lettering.sizePoints() > 6
        && typeface.width(title, lettering) > contentWidth() - copyWidth) {
      lettering = lettering.sized(lettering.sizePoints() - 0.5);
    }
    canvas.text(title, MARGIN, TOP + 4.5, lettering, Anchor.START);
    canvas.text(copy, right(), TOP + 4.5, Lettering.bold(11), Anchor.END);
    canvas.stroke(
        new java.awt.geom.Line2D.Double(MARGIN, TOP + 7, right(), TOP + 7), Palette.GRAPHITE, 0.3);
  }

  private void foot(Canvas canvas, SheetFacts facts, int page, int of) {
    double top = contentBottom() + 4;
    canvas.stroke(
        new java.awt.geom.Line2D.Double(MARGIN, top, right(), top), Palette.GRAPHITE, 0.3);
    String pageOf = words.say("sheet.page", Integer.toString(page), Integer.toString(of));
    double pageWidth = typeface.width(pageOf, Lettering.bold(11)) + 4;
    String when = DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm xxx").format(facts.printedAt());
    String about =
        words.say("sheet.shows", facts.shows(), facts.book())
            + "\n"
            + words.say("sheet.printed", facts.printedBy(), when)
            + " · "
            + words.say("sheet.history", Long.toString(facts.historyNumber()), facts.historyHead());
    List<String> lines = Wrap.lines(about, typeface, SMALL, contentWidth() - pageWidth);
    for (int i = 0; i < Math.min(lines.size(), 4); i++) {
      canvas.text(lines.get(i), MARGIN, top + 4 + 3.8 * i, SMALL, Anchor.START);
    }
    canvas.text(pageOf, right(), top + 4.6, Lettering.bold(11), Anchor.END);
  }

  /// Ends the sheets.
  ///
  /// @return the file's bytes
  public byte[] finish() {
    try {
      for (int i = 0; i < pages.size(); i++) {
        List<PdfCanvas> sheet = pages.get(i);
        for (int j = 0; j < sheet.size(); j++) {
          foot(sheet.get(j), sheets.get(i), j + 1, sheet.size());
          sheet.get(j).close();
        }
      }
      var bytes = new ByteArrayOutputStream();
      document.save(bytes);
      return bytes.toByteArray();
    } catch (IOException broken) {
      throw new UncheckedIOException(broken);
    }
  }

  @Override
  public void close() {
    try {
      document.close();
    } catch (IOException broken) {
      throw new UncheckedIOException(broken);
    }
  }
}
