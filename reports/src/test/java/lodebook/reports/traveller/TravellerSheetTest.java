package lodebook.reports.traveller;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.zxing.BinaryBitmap;
import com.google.zxing.RGBLuminanceSource;
import com.google.zxing.common.HybridBinarizer;
import com.google.zxing.qrcode.QRCodeReader;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.TreeSet;
import javax.imageio.ImageIO;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.magnet.MagnetType;
import lodebook.reports.Samples;
import lodebook.reports.sheet.Archive;
import lodebook.reports.sheet.PagePictures;
import lodebook.reports.sheet.PaperSize;
import lodebook.reports.sheet.SheetFacts;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;

final class TravellerSheetTest {
  private final Layout layout = Samples.layout(3, 4, Focus.OUT, 10, 13, false);
  private final MagnetType block = Samples.block(4, 4, 10);
  private final byte[] pdf =
      TravellerSheet.pdf(Samples.traveller(Samples.facts("R-0007"), layout, block));

  private static String text(byte[] pdf) throws IOException {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      return new PDFTextStripper().getText(document);
    }
  }

  private static SheetFacts german(int copy) {
    SheetFacts f = Samples.facts("R-0007");
    return new SheetFacts(
        f.code(),
        f.shows(),
        "Buch " + Samples.ALPHABETS,
        "ÄÖ",
        f.printedAt(),
        f.historyNumber(),
        f.historyHead(),
        copy,
        PaperSize.LETTER,
        Locale.GERMAN);
  }

  @Test
  void isAnArchiveFile() throws Exception {
    assertEquals(List.of(), Archive.faults(pdf));
    assertEquals(
        List.of(), Archive.faults(TravellerSheet.pdf(Samples.traveller(german(2), layout, block))));
  }

  @Test
  void sameTravellerSameBytesAnotherTimeOthers() {
    var again = TravellerSheet.pdf(Samples.traveller(Samples.facts("R-0007"), layout, block));
    assertArrayEquals(pdf, again);
    var other = TravellerSheet.pdf(Samples.traveller(Samples.facts("R-0008"), layout, block));
    assertFalse(Arrays.equals(pdf, other));
  }

  @Test
  void everyFontIsEmbedded() throws IOException {
    var fonts = new TreeSet<String>();
    try (PDDocument document = Loader.loadPDF(pdf)) {
      for (var page : document.getPages()) {
        for (var name : page.getResources().getFontNames()) {
          var font = page.getResources().getFont(name);
          assertTrue(font.isEmbedded(), font.getName());
          fonts.add(font.getName().replaceFirst("^[A-Z]{6}\\+", ""));
        }
      }
    }
    assertEquals(List.of("DejaVuSansCondensed", "DejaVuSansCondensed-Bold"), List.copyOf(fonts));
  }

  @Test
  void readsInOrder() throws IOException {
    String text = text(pdf).replaceAll("\\s+", " ");
    int from = 0;
    for (String part :
        List.of(
            "Traveller R-0007",
            "Layout STIR-IN rev A",
            "Before you handle these magnets",
            "Magnets in the order of slots",
            "step slot piece, tray and cell north reading expected mT read mT initials",
            "1 1 L-2404/0008 tray C cell 1",
            "north OUT",
            "radial +454 ± 12",
            "tangential 0.0 ± 9.2",
            "2 2 L-2404/0015 tray C cell 2",
            "north to slot 1",
            "12 12 L-2405/0085 tray C cell 12",
            "Built by, date",
            "Shows STIR-IN rev A · book: the shop's book",
            "printed by AB, 2026-12-01 14:05 +01:00 · history 1234 9f3a01c7",
            "page 3 of 3")) {
      int at = text.indexOf(part, from);
      assertNotEquals(-1, at, "missing after place " + from + ": " + part + "\n" + text);
      from = at + part.length();
    }
  }

  /// What a traveller that handles magnets must warn of, with the figures handed in.
  @Test
  void carriesTheNoticesWithSourcesAndDeferral() throws IOException {
    String text = text(pdf).replaceAll("\\s+", " ");
    for (String part :
        List.of(
            "The rules of your workplace and the people qualified for safety there decide",
            "pull together with up to 28 N",
            "Source: upper bound Br²·A/(2µ0)",
            "exceeds 0.5 mT within 42 mm of one magnet, and may exceed it within 95 mm of 12",
            "Source: 0.5 mT: Directive 2013/35/EU, action level; ICNIRP 2009",
            "Within 22 mm of a magnet the field exceeds 3 mT",
            "Wear eye protection",
            "Coating of this type: Ni-Cu-Ni.",
            "nickel can cause a skin allergy",
            "Keep magnets away from cards",
            "Do not drill, grind or saw: the dust catches fire",
            "Adhesive: two-part epoxy, 5 min. Handle it as its safety data sheet says",
            "Never warm above 80 °C, the highest working temperature of grade N42")) {
      assertTrue(text.contains(part), part);
    }
    String german = text(TravellerSheet.pdf(Samples.traveller(german(1), layout, block)));
    assertTrue(german.contains("Vor dem Umgang mit diesen Magneten"));
    assertTrue(german.contains("Zwei Magnete der Art BLK-4-4-10 ziehen sich mit bis zu 28 N an"));
  }

  @Test
  void aSecondPrintSaysSoOnEveryPage() throws IOException {
    String text = text(TravellerSheet.pdf(Samples.traveller(german(2), layout, block)));
    assertEquals(text.split("Seite \\d+ von", -1).length, text.split("Kopie 2", -1).length);
    assertFalse(text(pdf).contains("copy"));
  }

  @Test
  void severalTravellersInOneFileCountTheirPagesEachAlone() throws Exception {
    Traveller first = Samples.traveller(Samples.facts("R-0007"), layout, block);
    Traveller second = Samples.traveller(Samples.facts("R-0003"), layout, block);
    byte[] both = TravellerSheet.pdf(List.of(first, second));
    assertEquals(List.of(), Archive.faults(both));
    String one = text(pdf);
    assertEquals(one + one.replace("R-0007", "R-0003"), text(both));
    assertTrue(one.matches("(?s).*page 2 of \\d\\s.*"), one);
  }

  /// 300 slots: each step once, the head on every page of the table, no row alone on a page.
  @Test
  void aLongTableBreaksWell() throws IOException {
    Layout large = Samples.layout(75, 4, Focus.IN, 200, 196, false);
    byte[] long300 = TravellerSheet.pdf(Samples.traveller(Samples.facts("R-0300"), large, block));
    var cells = new ArrayList<Integer>();
    try (PDDocument document = Loader.loadPDF(long300)) {
      for (int page = 3; page <= document.getNumberOfPages(); page++) {
        var stripper = new PDFTextStripper();
        stripper.setStartPage(page);
        stripper.setEndPage(page);
        String text = stripper.getText(document);
        int rows = text.split("tray C cell", -1).length - 1;
        assertNotEquals(1, rows, "a row alone on page " + page);
        assertEquals(rows > 0, text.contains("piece, tray and cell"), "head on page " + page);
      }
      var matcher =
          java.util.regex.Pattern.compile("tray C cell (\\d+)")
              .matcher(new PDFTextStripper().getText(document));
      while (matcher.find()) {
        cells.add(Integer.valueOf(matcher.group(1)));
      }
    }
    assertEquals(java.util.stream.IntStream.rangeClosed(1, 300).boxed().toList(), cells);
  }

  @Test
  void unmeasuredPiecesAndNoReadings() throws IOException {
    List<Step> steps = new ArrayList<>();
    for (int slot = 1; slot <= 12; slot++) {
      steps.add(
          new Step(
              slot, "L-9", null, null, null, layout.ruleFacing(slot), "hold it", List.of(), false));
    }
    String text =
        text(
            TravellerSheet.pdf(
                Samples.traveller(
                    Samples.facts("R-9"),
                    layout,
                    block,
                    steps,
                    true,
                    Samples.expected(layout, 3))));
    assertTrue(text.contains("any of L-9"));
    assertTrue(text.contains("hold it"));
    assertTrue(text.contains("Steps in the order of filling"));
    assertTrue(text.contains("Order of filling: every second slot, then those between."), text);
    assertTrue(text.contains("Readings of the finished ring"));
    assertTrue(text.contains("\u2212454 ±"), text);
  }

  @Test
  void theCodeCanBeScannedFromAGreyAndBlurredPage() throws Exception {
    BufferedImage page =
        ImageIO.read(new ByteArrayInputStream(PagePictures.of(pdf, 150, true).getFirst()));
    var blur =
        new java.awt.image.Kernel(
            3, 3, new float[] {.06f, .12f, .06f, .12f, .28f, .12f, .06f, .12f, .06f});
    var rgb = new BufferedImage(page.getWidth(), page.getHeight(), BufferedImage.TYPE_INT_RGB);
    rgb.createGraphics().drawImage(page, 0, 0, null);
    BufferedImage soft = new java.awt.image.ConvolveOp(blur).filter(rgb, null);
    int[] pixels = soft.getRGB(0, 0, soft.getWidth(), soft.getHeight(), null, 0, soft.getWidth());
    var source = new RGBLuminanceSource(soft.getWidth(), soft.getHeight(), pixels);
    var bitmap = new BinaryBitmap(new HybridBinarizer(source));
    assertEquals("R-0007", new QRCodeReader().decode(bitmap).getText());
  }

  @Test
  void aSlotTwiceIsRefused() {
    var step = new Step(3, "L-9", null, null, null, layout.ruleFacing(3), null, List.of(), false);
    var refused =
        assertThrows(
            IllegalArgumentException.class,
            () ->
                TravellerSheet.pdf(
                    Samples.traveller(
                        Samples.facts("R-9"),
                        layout,
                        block,
                        List.of(step, step),
                        false,
                        List.of())));
    assertEquals("the traveller of rotor R-9 names slot 3 twice", refused.getMessage());
  }
}
