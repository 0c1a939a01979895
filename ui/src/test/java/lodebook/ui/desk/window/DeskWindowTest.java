package lodebook.ui.desk.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Locale;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.Labeled;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.stage.Stage;
import lodebook.db.builds.Rotors;
import lodebook.ui.desk.DeskShop;
import lodebook.ui.desk.Fx;
import lodebook.ui.desk.bench.BenchGauge;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.look.Theme;
import lodebook.ui.desk.run.BackgroundRunner;
import lodebook.ui.desk.run.Runner;
import lodebook.ui.desk.station.Station;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// The main paths through real controls, on the headless platform.
class DeskWindowTest {
  @TempDir
  @SuppressWarnings("NullAway.Init")
  private Path folder;

  @SuppressWarnings("NullAway.Init")
  private DeskShop shop;

  @BeforeEach
  void openShop() {
    shop = DeskShop.in(folder);
  }

  private DeskWindow window(Station station, Runner runner) {
    return Fx.on(
        () -> {
          DeskWindow window =
              new DeskWindow(station, runner, new SimpleObjectProperty<>(new Look(Theme.LIGHT)));
          Stage stage = new Stage();
          stage.setScene(new Scene(window.root(), 1000, 800));
          stage.show();
          return window;
        });
  }

  private static void settle(DeskWindow window) {
    window.root().applyCss();
    window.root().layout();
  }

  private static Node find(DeskWindow window, String selector) {
    settle(window);
    Node found = window.root().lookup(selector);
    assertNotNull(found, selector);
    return found;
  }

  private static void enter(DeskWindow window, String field, String text) {
    TextField typed = (TextField) find(window, field);
    typed.setText(text);
    typed.fireEvent(
        new KeyEvent(KeyEvent.KEY_PRESSED, "", "", KeyCode.ENTER, false, false, false, false));
    settle(window);
  }

  private static String said(DeskWindow window, String selector) {
    return ((Labeled) find(window, selector)).getText();
  }

  @Test
  void aScannedRotorIsBuiltWithOneWrongMagnetThatIsFlaggedAndTurned() {
    Station station = shop.station(Locale.ENGLISH, "TB");
    BenchGauge gauge = new BenchGauge(station);
    DeskWindow window = window(station, shop.runner(station));
    Fx.run(
        () -> {
          enter(window, "#number", "r-9");
          assertTrue(said(window, ".sentence").startsWith("Slot 1: tray TR-C cell "));
          enter(window, "#reading", gauge.reads("R-9"));
          enter(window, "#reading", gauge.reads("R-9"));
          int slot = gauge.slot("R-9");
          enter(window, "#reading", gauge.reads("R-9", slot));
          if (window.root().lookup("#reading") != null) {
            enter(window, "#reading", gauge.reads("R-9", slot));
          }
          assertTrue(
              said(window, ".said.wrong .first").startsWith("Slot " + slot + " is reversed: "),
              said(window, ".said.wrong .first"));
          ((Button) find(window, "#bench-turned")).fire();
          enter(window, "#reading", gauge.reads("R-9"));
          assertTrue(said(window, ".said.right .first").endsWith("reads as it should."));
        });
    assertEquals(2, station.with(book -> new Rotors(book).show("R-9")).rotor().filled());
    assertFalse(Files.exists(shop.log().file()), "a defect was logged");
  }

  @Test
  void anUnknownNumberIsAnsweredWithASentence() {
    Station station = shop.station(Locale.ENGLISH, "TB");
    DeskWindow window = window(station, shop.runner(station));
    Fx.run(
        () -> {
          enter(window, "#number", "NO-SUCH");
          assertTrue(
              said(window, ".said.wrong .first").contains("NO-SUCH"),
              said(window, ".said.wrong .first"));
        });
  }

  @Test
  void everyNumberOpensItsRoom() {
    Finder finder = new Finder(shop.station(Locale.ENGLISH, "TB"));
    assertEquals(new Finder.Place("bench", "R-9"), finder.find(" r-9 "));
    assertEquals(new Finder.Place("stock", "L-2501"), finder.find("l-2501"));
    assertEquals(new Finder.Place("stock", "L-2501/0007"), finder.find("L-2501/7"));
    assertEquals(new Finder.Place("stock", "TR-C"), finder.find("TR-C"));
    assertEquals(new Finder.Place("trace", "U-101"), finder.find("U-101"));
    assertEquals(new Finder.Place("survey", "S-1"), finder.find("S-1"));
    assertEquals(new Finder.Place("trace", "B-31-0001"), finder.find("B-31-0001"));
  }

  /// Two windows on one book: what one station does, the other shows within 2 s.
  @Test
  void anotherStationsWorkIsSeenWithinTwoSeconds() {
    Station here = shop.station(Locale.ENGLISH, "TB");
    try (BackgroundRunner runner = new BackgroundRunner(shop.troubles(here))) {
      DeskWindow window = window(here, runner);
      Fx.run(window::begin);
      Fx.until(
          "R-9 waits",
          Duration.ofSeconds(20),
          () -> shows(window, "R-9") && !shows(window, "R-77"));
      Fx.run(window::lookForChanges);
      Fx.until("the first look is over", Duration.ofSeconds(20), window::looked);
      shop.does("rotor", "open", "STIR-IN", "--serial", "R-77");
      Fx.until("R-77 waits too", Duration.ofSeconds(20), () -> shows(window, "R-77"));
      Fx.run(window::end);
    }
  }

  private static boolean shows(DeskWindow window, String text) {
    settle(window);
    return window.root().lookupAll(".key").stream()
            .anyMatch(n -> n instanceof Button key && key.getText().equals(text))
        || window.root().lookupAll(".label").stream()
            .anyMatch(n -> n instanceof Label label && label.getText().equals(text));
  }
}
