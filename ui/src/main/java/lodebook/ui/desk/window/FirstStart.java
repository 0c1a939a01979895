package lodebook.ui.desk.window;

import java.nio.file.Files;
import java.util.function.Supplier;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.TextField;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import lodebook.db.book.Act;
import lodebook.db.book.BookAddress;
import lodebook.db.keep.NewBook;
import lodebook.db.people.People;
import lodebook.db.rights.Person;
import lodebook.db.rights.Role;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.room.Said;
import lodebook.ui.desk.room.Slip;
import lodebook.ui.desk.run.Runner;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.words.DeskWords;

/// What stands in the window while there is no book: who leads the shop makes it.
final class FirstStart {
  private static final double WIDTH = 640;

  private final Station station;
  private final Runner runner;
  private final DeskWords words;
  private final javafx.beans.property.ObjectProperty<Said> said =
      new javafx.beans.property.SimpleObjectProperty<>(Said.NOTHING);

  FirstStart(Station station, Runner runner) {
    this.station = station;
    this.runner = runner;
    this.words = station.words();
  }

  /// Whether there is no book where one is meant to be.
  static boolean needed(BookAddress address) {
    return address instanceof BookAddress.Folder folder
        && !Files.exists(folder.path().resolve("book.mv.db"));
  }

  /// The page.
  ///
  /// @param made what happens once there is a book and somebody leads it
  Node page(Runnable made) {
    TextField initials = new TextField();
    initials.setPromptText(words.say("shop.initials"));
    initials.setId("first-initials");
    TextField name = new TextField();
    name.setPromptText(words.say("shop.full-name"));
    name.setId("first-name");
    Runnable make = () -> make(initials.getText().strip(), name.getText().strip(), made);
    name.setOnAction(_ -> make.run());
    FlowPane line =
        new FlowPane(10, 10, initials, name, Keys.key(words.say("first.make"), make, "call"));
    VBox sheet =
        new VBox(
            14,
            Keys.words(words.say("first.title"), "title"),
            Keys.words(words.say("first.where", station.address().shown()), "quiet"),
            Keys.words(words.say("first.who")),
            line,
            new Slip(said),
            Keys.words(words.say("first.demo"), "quiet"));
    sheet.setMaxWidth(WIDTH);
    sheet.setPadding(new Insets(60, 18, 18, 18));
    StackPane middle = new StackPane(sheet);
    StackPane.setAlignment(sheet, Pos.TOP_CENTER);
    return middle;
  }

  private void make(String initials, String name, Runnable made) {
    if (initials.isEmpty() || name.isEmpty()) {
      said.set(Said.of(Said.Tone.OPEN, words.say("first.both")));
      return;
    }
    Supplier<Person> work =
        () -> {
          if (needed(station.address())) {
            NewBook.create(station.address(), station.visit());
          }
          return station.with(
              book -> new People(book).add(Act.by(null), initials, name, Role.LEAD));
        };
    runner.run(
        words.say("doing.record"),
        work,
        person -> {
          station.takenBy(person);
          made.run();
        },
        trouble -> said.set(Said.of(trouble)));
  }
}
