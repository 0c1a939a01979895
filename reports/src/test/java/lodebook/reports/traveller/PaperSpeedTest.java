package lodebook.reports.traveller;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.Focus;
import lodebook.reports.Samples;
import lodebook.reports.canvas.Typeface;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.font.PDType0Font;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/// Speed of paper as a ratio in one run, written to `target/paper-speed.txt`.
@Tag("slow")
final class PaperSpeedTest {
  private static final int ROUNDS = 60;

  /// A traveller of 48 slots takes at most three times as long as the same words on bare pages with
  /// the same two fonts embedded.
  @Test
  void aTravellerTakesAtMostThreeTimesItsBareText() throws IOException {
    Traveller traveller =
        Samples.traveller(
            Samples.facts("R-0048"),
            Samples.layout(12, 4, Focus.IN, 40, 36, false),
            Samples.block(4, 4, 10));
    List<List<String>> pages = pages(TravellerSheet.pdf(traveller));
    double[] sheet = new double[ROUNDS];
    double[] bare = new double[ROUNDS];
    for (int warm = 0; warm < 2; warm++) {
      for (int i = 0; i < ROUNDS; i++) {
        bare[i] = milliseconds(() -> bare(pages));
        sheet[i] = milliseconds(() -> TravellerSheet.pdf(traveller));
      }
    }
    double ratio = median(sheet) / median(bare);
    String said =
        String.format(
            Locale.ROOT,
            "traveller of 48 slots %.1f ms, its text on bare pages %.1f ms, ratio %.2f%n",
            median(sheet),
            median(bare),
            ratio);
    Files.writeString(Path.of("target", "paper-speed.txt"), said);
    assertTrue(ratio <= 3, said);
  }

  private static List<List<String>> pages(byte[] pdf) throws IOException {
    List<List<String>> pages = new ArrayList<>();
    try (PDDocument document = Loader.loadPDF(pdf)) {
      for (int page = 1; page <= document.getNumberOfPages(); page++) {
        var stripper = new PDFTextStripper();
        stripper.setStartPage(page);
        stripper.setEndPage(page);
        pages.add(stripper.getText(document).lines().toList());
      }
    }
    return pages;
  }

  private static byte[] bare(List<List<String>> pages) {
    try (var document = new PDDocument()) {
      PDType0Font plain = font(document, "DejaVuSansCondensed.ttf");
      PDType0Font bold = font(document, "DejaVuSansCondensed-Bold.ttf");
      for (List<String> lines : pages) {
        var page = new PDPage(PDRectangle.A4);
        document.addPage(page);
        try (var content = new PDPageContentStream(document, page)) {
          for (int i = 0; i < lines.size(); i++) {
            content.beginText();
            content.setFont(i % 2 == 0 ? plain : bold, 11);
            content.newLineAtOffset(40, 800 - 5 * i);
            content.showText(lines.get(i));
            content.endText();
          }
        }
      }
      var out = new ByteArrayOutputStream();
      document.save(out);
      return out.toByteArray();
    } catch (IOException broken) {
      throw new UncheckedIOException(broken);
    }
  }

  private static PDType0Font font(PDDocument document, String file) throws IOException {
    try (var in = Typeface.class.getResourceAsStream(file)) {
      return PDType0Font.load(document, in, true);
    }
  }

  private static double milliseconds(java.util.function.Supplier<byte[]> work) {
    long start = System.nanoTime();
    byte[] made = work.get();
    long end = System.nanoTime();
    assertTrue(made.length > 1000);
    return (end - start) / 1e6;
  }

  private static double median(double... values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    return sorted[sorted.length / 2];
  }
}
