package lodebook.ui.desk.ring;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Scene;
import javafx.scene.image.PixelReader;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.PickResult;
import javafx.scene.paint.Color;
import lodebook.db.builds.Rotors;
import lodebook.reports.ring.RingPicture;
import lodebook.ui.desk.DeskShop;
import lodebook.ui.desk.Fx;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.look.Theme;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.words.DeskWords;
import lodebook.ui.paper.RingPictures;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// The ring on the screen: turned, touched, read aloud. Rotor `B-31-0001` has 12 slots that rise
/// clockwise.
class RingControlTest {
  @TempDir
  @SuppressWarnings("NullAway.Init")
  private static Path folder;

  @SuppressWarnings("NullAway.Init")
  private static RingPicture picture;

  @BeforeAll
  static void readRing() {
    Station station = DeskShop.in(folder).station(Locale.ENGLISH, "TB");
    picture =
        station.with(book -> RingPictures.of(new Rotors(book).show("B-31-0001"), Locale.ENGLISH));
  }

  private static RingControl ring() {
    RingControl ring =
        new RingControl(
            new DeskWords(Locale.ENGLISH, ZoneOffset.UTC),
            new SimpleObjectProperty<>(new Look(Theme.LIGHT)));
    new Scene(ring, 500, 500);
    ring.picture().set(picture);
    ring.resize(500, 500);
    ring.layout();
    return ring;
  }

  private static void touch(RingControl ring, double x, double y) {
    ring.fireEvent(
        new MouseEvent(
            MouseEvent.MOUSE_CLICKED,
            x,
            y,
            x,
            y,
            MouseButton.PRIMARY,
            1,
            false,
            false,
            false,
            false,
            true,
            false,
            false,
            true,
            false,
            true,
            new PickResult(ring, x, y)));
    ring.layout();
  }

  private static void press(RingControl ring, KeyCode code) {
    ring.fireEvent(new KeyEvent(KeyEvent.KEY_PRESSED, "", "", code, false, false, false, false));
    ring.layout();
  }

  @Test
  void aTouchChoosesTheSlotThatLiesThere() {
    List<Integer> touched = new ArrayList<>();
    Fx.run(
        () -> {
          RingControl ring = ring();
          ring.whenTouched(touched::add);
          touch(ring, 250, 60);
          touch(ring, 440, 250);
          touch(ring, 250, 440);
          touch(ring, 60, 250);
        });
    assertEquals(List.of(1, 4, 7, 10), touched);
  }

  @Test
  void anySlotStandsOnTopAndTheOtherFaceIsMirrored() {
    List<Integer> touched = new ArrayList<>();
    Fx.run(
        () -> {
          RingControl ring = ring();
          ring.whenTouched(touched::add);
          ring.top().set(5);
          ring.layout();
          touch(ring, 250, 60);
          touch(ring, 440, 250);
          ring.otherFace().set(true);
          ring.layout();
          touch(ring, 250, 60);
          touch(ring, 440, 250);
        });
    assertEquals(List.of(5, 8, 5, 2), touched);
  }

  @Test
  void theKeyboardReachesEverySlotAndBothFaces() {
    Fx.run(
        () -> {
          RingControl ring = ring();
          press(ring, KeyCode.HOME);
          press(ring, KeyCode.RIGHT);
          press(ring, KeyCode.RIGHT);
          assertEquals(3, ring.chosen().get());
          press(ring, KeyCode.SPACE);
          assertEquals(3, ring.top().get());
          press(ring, KeyCode.F);
          press(ring, KeyCode.RIGHT);
          assertEquals(2, ring.chosen().get());
          press(ring, KeyCode.LEFT);
          press(ring, KeyCode.LEFT);
          assertEquals(4, ring.chosen().get());
        });
  }

  @Test
  void aScreenReaderIsToldTheFaceTheWayAndTheSlot() {
    Fx.run(
        () -> {
          RingControl ring = ring();
          ring.tellsOf(slot -> "Slot " + slot + ": north OUT.");
          ring.layout();
          assertEquals(
              "Ring B-31-0001, 12 slots, marked face, numbers rise clockwise.",
              ring.getAccessibleText());
          press(ring, KeyCode.HOME);
          press(ring, KeyCode.F);
          assertEquals(
              "Ring B-31-0001, 12 slots, other face, mirrored, numbers rise counter-clockwise."
                  + " Slot 1: north OUT.",
              ring.getAccessibleText());
        });
  }

  /// Slot 1 of the ring faces out: the half of its magnet away from the axis has the tint of north.
  @Test
  void theDrawingOfThePaperIsOnTheScreenInTheThemesColours() {
    Fx.run(
        () -> {
          RingControl ring = ring();
          PixelReader pixels = ring.snapshot(null, null).getPixelReader();
          Color north = new Look(Theme.LIGHT).color("-north");
          Color south = new Look(Theme.LIGHT).color("-south");
          int tops = 0;
          int below = 0;
          int lowestNorth = 0;
          int highestSouth = 500;
          for (int y = 0; y < 250; y++) {
            Color at = pixels.getColor(236, y);
            if (near(at, north)) {
              tops++;
              lowestNorth = y;
            } else if (near(at, south)) {
              below++;
              highestSouth = Math.min(highestSouth, y);
            }
          }
          assertTrue(tops > 8 && below > 8, tops + " pixels of north, " + below + " of south");
          assertTrue(lowestNorth <= highestSouth, lowestNorth + " and " + highestSouth);
        });
  }

  private static boolean near(Color a, Color b) {
    return Math.abs(a.getRed() - b.getRed()) < 0.03
        && Math.abs(a.getGreen() - b.getGreen()) < 0.03
        && Math.abs(a.getBlue() - b.getBlue()) < 0.03;
  }
}
