package lodebook.reports.ring;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.geom.GeneralPath;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import lodebook.reports.Samples;
import lodebook.reports.sheet.Archive;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.contentstream.PDFGraphicsStreamEngine;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.graphics.image.PDImage;
import org.junit.jupiter.api.Test;

final class RingFilesTest {
  private final Layout layout = Samples.layout(12, 4, Focus.IN, 50, 44, false);
  private final RingPicture picture =
      Samples.picture(layout, Samples.block(4, 5, 10), "R-1", s -> null);

  /// Bounds of everything stroked on a page, points.
  private static final class Strokes extends PDFGraphicsStreamEngine {
    final List<Rectangle2D> bounds = new ArrayList<>();
    private GeneralPath path = new GeneralPath();

    Strokes(PDPage page) {
      super(page);
    }

    @Override
    public void appendRectangle(Point2D a, Point2D b, Point2D c, Point2D d) {
      throw new AssertionError("the program draws no rectangles of this kind");
    }

    @Override
    public void drawImage(PDImage image) {
      throw new AssertionError("the program draws no images");
    }

    @Override
    public void clip(int rule) {}

    @Override
    public void moveTo(float x, float y) {
      path.moveTo(x, y);
    }

    @Override
    public void lineTo(float x, float y) {
      path.lineTo(x, y);
    }

    @Override
    public void curveTo(float x1, float y1, float x2, float y2, float x3, float y3) {
      path.curveTo(x1, y1, x2, y2, x3, y3);
    }

    @Override
    public Point2D getCurrentPoint() {
      return path.getCurrentPoint();
    }

    @Override
    public void closePath() {
      path.closePath();
    }

    @Override
    public void endPath() {
      path = new GeneralPath();
    }

    @Override
    public void strokePath() {
      bounds.add(path.getBounds2D());
      endPath();
    }

    @Override
    public void fillPath(int rule) {
      endPath();
    }

    @Override
    public void fillAndStrokePath(int rule) {
      strokePath();
    }

    @Override
    public void shadingFill(COSName name) {}
  }

  /// The blocks of slots 1 and 25 stand opposite each other, square to the page: 4 mm thick, 5 mm
  /// wide, 100 mm apart, measured in the PDF's own coordinates.
  @Test
  void trueSizeIsTrue() throws IOException {
    byte[] pdf = RingFiles.pdf(picture, Samples.facts("R-1"));
    try (PDDocument document = Loader.loadPDF(pdf)) {
      assertEquals(1, document.getNumberOfPages());
      var strokes = new Strokes(document.getPage(0));
      strokes.processPage(document.getPage(0));
      double millimetre = 72 / 25.4;
      List<Rectangle2D> square =
          strokes.bounds.stream()
              .filter(b -> Math.abs(b.getWidth() / millimetre - 5) < 0.2)
              .filter(b -> Math.abs(b.getHeight() / millimetre - 4) < 0.2)
              .toList();
      assertEquals(2, square.size());
      double apart = square.get(0).getCenterY() - square.get(1).getCenterY();
      assertEquals(100, apart / millimetre, 0.02);
      assertEquals(square.get(0).getCenterX(), square.get(1).getCenterX(), 0.01);
    }
  }

  @Test
  void pdfIsAnArchiveFileAndAlwaysTheSame() throws Exception {
    byte[] pdf = RingFiles.pdf(picture, Samples.facts("R-1"));
    assertEquals(List.of(), Archive.faults(pdf));
    assertArrayEquals(pdf, RingFiles.pdf(picture, Samples.facts("R-1")));
  }

  @Test
  void pngIsAPictureAndAlwaysTheSame() throws IOException {
    byte[] png = RingFiles.png(picture);
    assertEquals(1440, ImageIO.read(new ByteArrayInputStream(png)).getWidth());
    assertArrayEquals(png, RingFiles.png(picture));
  }

  @Test
  void svgIsWellFormedAndNamesItsTexts() throws Exception {
    byte[] svg = RingFiles.svg(picture);
    var document =
        DocumentBuilderFactory.newInstance()
            .newDocumentBuilder()
            .parse(new ByteArrayInputStream(svg));
    assertEquals("180mm", document.getDocumentElement().getAttribute("width"));
    String text = new String(svg, StandardCharsets.UTF_8);
    assertEquals(49, text.split("aria-label=\"N\"", -1).length - 1);
    assertTrue(text.contains("aria-label=\"48\""));
  }
}
