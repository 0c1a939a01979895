package lodebook.ui.desk.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Locale;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Scene;
import javafx.scene.control.Labeled;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.stage.Stage;
import lodebook.db.book.BookAddress;
import lodebook.db.people.People;
import lodebook.ui.desk.Fx;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.look.Theme;
import lodebook.ui.desk.run.DefectLog;
import lodebook.ui.desk.run.InPlaceRunner;
import lodebook.ui.desk.run.Troubles;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.words.DeskWords;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// A window where no book is yet.
class FirstStartTest {
  @TempDir
  @SuppressWarnings("NullAway.Init")
  private Path folder;

  @Test
  void whoLeadsTheShopMakesTheBookAndIsAtTheStation() {
    Clock clock = Clock.fixed(Instant.parse("2026-12-02T09:00:00Z"), ZoneOffset.UTC);
    DeskWords words = new DeskWords(Locale.ENGLISH, ZoneOffset.UTC);
    Station station =
        new Station(new BookAddress.Folder(folder.resolve("book")), "BENCH-1", clock, words);
    InPlaceRunner runner =
        new InPlaceRunner(new Troubles(words, new DefectLog(folder.resolve("log"), clock)));
    Fx.run(
        () -> {
          DeskWindow window =
              new DeskWindow(station, runner, new SimpleObjectProperty<>(new Look(Theme.DARK)));
          Stage stage = new Stage();
          stage.setScene(new Scene(window.root(), 1000, 800));
          stage.show();
          window.begin();
          window.root().applyCss();
          window.root().layout();
          assertTrue(window.root().lookup("#door-stock").isDisabled());
          ((TextField) window.root().lookup("#first-initials")).setText("AB");
          TextField name = (TextField) window.root().lookup("#first-name");
          name.setText("A. Baker");
          name.fireEvent(
              new KeyEvent(
                  KeyEvent.KEY_PRESSED, "", "", KeyCode.ENTER, false, false, false, false));
          window.root().applyCss();
          window.root().layout();
          window.end();
          assertFalse(window.root().lookup("#door-stock").isDisabled());
          Labeled said = (Labeled) window.root().lookup(".said.right .first");
          assertEquals("Nothing waits.", said.getText());
        });
    assertEquals(
        List.of("AB"),
        station.with(book -> new People(book).list().stream().map(p -> p.initials()).toList()));
    assertEquals("AB", String.valueOf(station.act().by()));
  }
}
