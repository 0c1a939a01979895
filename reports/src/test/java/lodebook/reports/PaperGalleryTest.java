package lodebook.reports;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.magnet.Shape;
import lodebook.reports.ring.DrawnSlot;
import lodebook.reports.ring.Face;
import lodebook.reports.ring.RingFiles;
import lodebook.reports.ring.RingPicture;
import lodebook.reports.ring.ShownReading;
import lodebook.reports.sheet.PagePictures;
import lodebook.reports.traveller.Step;
import lodebook.reports.traveller.TravellerSheet;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/// Writes pictures of every sheet to `docs/papers`, to be looked at.
@Tag("slow")
final class PaperGalleryTest {
  private static final Path FOLDER = Path.of("..", "docs", "papers");
  private static final float DOTS_PER_INCH = 80;

  @Test
  void everySheetIsShown() throws IOException {
    Files.createDirectories(FOLDER);
    Layout small = Samples.layout(3, 4, Focus.OUT, 10, 13, false);
    Layout large = Samples.layout(12, 4, Focus.IN, 40, 36, false);
    var block = Samples.block(4, 4, 10);
    pages(
        "traveller-12",
        TravellerSheet.pdf(Samples.traveller(Samples.facts("R-0007"), small, block)),
        false);
    pages("traveller-12-filling-grey", filling(small), true);
    pages(
        "traveller-48",
        TravellerSheet.pdf(Samples.traveller(Samples.facts("R-0048"), large, block)),
        false);
    ring("ring-blocks", Samples.picture(large, block, "R-0048", s -> "L-240" + (s + 15) / 16));
    ring("ring-survey", surveyed(large));
    ring(
        "ring-discs-k2",
        RingPicture.ofLayout(
            Samples.layout(12, 2, Focus.OUT, 30, 33, false),
            Samples.round(Shape.DISC, 3, 0, 6, 0, 0),
            null,
            Locale.ENGLISH));
    ring(
        "ring-rods-k3-german",
        RingPicture.ofLayout(
            Samples.layout(6, 3, Focus.IN, 20, 16, true),
            Samples.round(Shape.ROD, 0, 10, 5, 0, 0),
            null,
            Locale.GERMAN));
    ring(
        "ring-turned-k8-other-face",
        RingPicture.ofLayout(
                Samples.layout(2, 8, Focus.IN, 18, 14, true), block, null, Locale.ENGLISH)
            .seenOn(Face.OTHER));
    try (var files = Files.list(FOLDER)) {
      assertTrue(files.count() >= 12);
    }
  }

  private static byte[] filling(Layout layout) {
    List<Step> steps = new ArrayList<>();
    for (int slot : List.of(1, 7, 4, 10, 2, 8, 5, 11, 3, 9, 6, 12)) {
      steps.add(
          new Step(
              slot,
              "L-2404",
              null,
              null,
              null,
              layout.ruleFacing(slot),
              "presses on the outer wall with 11 N, lifts with 1 N: hold until set",
              Samples.expected(layout, slot),
              slot == 1));
    }
    return TravellerSheet.pdf(
        Samples.traveller(
            Samples.facts("R-0009"),
            layout,
            Samples.block(4, 4, 10),
            steps,
            true,
            Samples.expected(layout, 1)));
  }

  private static RingPicture surveyed(Layout layout) {
    List<DrawnSlot> slots = new ArrayList<>();
    List<ShownReading> readings = new ArrayList<>();
    for (int slot = 1; slot <= layout.slots(); slot++) {
      slots.add(
          new DrawnSlot(slot, layout.ruleFacing(slot), "L-2404", slot == 11 ? "reversed" : null));
      double share = slot == 11 ? -0.48 : 1.01;
      Samples.expected(layout, slot)
          .forEach(
              e ->
                  readings.add(
                      new ShownReading(
                          e.point(), e.valueTesla(), e.bandTesla(), share * e.valueTesla())));
    }
    return new RingPicture(
        layout,
        Samples.block(4, 4, 10),
        null,
        "R-0048",
        slots,
        Face.MARKED,
        11,
        readings,
        Locale.ENGLISH);
  }

  private static void ring(String name, RingPicture picture) throws IOException {
    byte[] pdf = RingFiles.pdf(picture, Samples.facts(picture.title()));
    pages(name, pdf, false);
  }

  private static void pages(String name, byte[] pdf, boolean grey) throws IOException {
    List<byte[]> pages = PagePictures.of(pdf, DOTS_PER_INCH, grey);
    for (int i = 0; i < Math.min(3, pages.size()); i++) {
      String page = pages.size() == 1 ? "" : "-" + (i + 1);
      Files.write(FOLDER.resolve(name + page + ".png"), pages.get(i));
    }
  }
}
