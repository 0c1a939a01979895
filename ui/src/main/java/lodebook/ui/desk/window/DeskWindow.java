package lodebook.ui.desk.window;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javafx.animation.Animation;
import javafx.animation.KeyFrame;
import javafx.animation.Timeline;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Parent;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.util.Duration;
import lodebook.db.people.People;
import lodebook.db.rights.Person;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.look.Theme;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.room.Question;
import lodebook.ui.desk.room.Room;
import lodebook.ui.desk.room.Said;
import lodebook.ui.desk.room.Slip;
import lodebook.ui.desk.run.Runner;
import lodebook.ui.desk.run.Trouble;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.station.Watch;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// The one window: rooms in the order of the day, a field for any number, the room, the foot.
public final class DeskWindow {
  private static final Duration LOOK_EVERY = Duration.millis(1500);

  private final Station station;
  private final Runner runner;
  private final DeskWords words;
  private final Finder finder;
  private final Watch watch;
  private final ObjectProperty<Look> look;
  private final ObjectProperty<Said> said = new SimpleObjectProperty<>(Said.NOTHING);
  private final Map<String, Room> rooms = new LinkedHashMap<>();
  private final Map<String, Button> doors = new LinkedHashMap<>();
  private final TextField number = new TextField();
  private final StackPane root = new StackPane();
  private final StackPane middle = new StackPane();
  private final Label person = new Label();
  private final Label theme = new Label();
  private final Question question = new Question(root);
  private final Timeline looking = new Timeline(new KeyFrame(LOOK_EVERY, _ -> lookForChanges()));
  private @Nullable Room here;
  private boolean waiting;
  private boolean looked;

  /// @param station the station
  /// @param runner does what takes time
  /// @param look the theme in force
  public DeskWindow(Station station, Runner runner, ObjectProperty<Look> look) {
    this.station = station;
    this.runner = runner;
    this.words = station.words();
    this.finder = new Finder(station);
    this.watch = new Watch(station);
    this.look = look;
    for (Room room : Rooms.all(station, runner, look, this::open)) {
      rooms.put(room.key(), room);
    }
    BorderPane frame = new BorderPane(middle, head(), null, foot(), null);
    root.getChildren().add(frame);
    look.get().dress(root);
    look.addListener((_, _, now) -> now.dress(root));
    root.addEventFilter(KeyEvent.KEY_PRESSED, this::anywhere);
    looking.setCycleCount(Animation.INDEFINITE);
  }

  /// What stands in the window.
  public Parent root() {
    return root;
  }

  /// Opens the first room, asks who is here, and begins to look for others' changes.
  public void begin() {
    if (FirstStart.needed(station.address())) {
      doors.values().forEach(door -> door.setDisable(true));
      number.setDisable(true);
      middle.getChildren().setAll(new FirstStart(station, runner).page(this::bookIsThere));
      return;
    }
    bookIsThere();
  }

  private void bookIsThere() {
    doors.values().forEach(door -> door.setDisable(false));
    number.setDisable(false);
    open(rooms.keySet().iterator().next(), null);
    if (station.who().get() == null) {
      askWho();
    }
    looking.play();
  }

  /// Looks no more.
  public void end() {
    looking.stop();
  }

  /// Whether the room would lose something that was typed.
  public boolean unfinished() {
    return here != null && here.unfinished();
  }

  private Region head() {
    HBox day = new HBox();
    day.getStyleClass().add("day");
    for (Room room : rooms.values()) {
      Button door = Keys.key(words.say("room." + room.key()), () -> open(room.key(), null));
      door.getStyleClass().setAll("door");
      door.setId("door-" + room.key());
      doors.put(room.key(), door);
      day.getChildren().add(door);
    }
    number.setPromptText(words.say("window.number"));
    number.getStyleClass().add("number-field");
    number.setId("number");
    number.setOnAction(_ -> find());
    number.setAccessibleText(words.say("window.number"));
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    HBox line = new HBox(day, between, number);
    line.getStyleClass().add("head");
    Slip slip = new Slip(said);
    VBox head = new VBox(4, line, slip);
    VBox.setMargin(slip, new Insets(2, 18, 2, 18));
    return head;
  }

  private Region foot() {
    Label book = new Label(words.say("window.book", station.address().shown()));
    Label where = new Label(words.say("window.station", station.name()));
    Label busy = new Label();
    busy.getStyleClass().add("busy");
    busy.textProperty().bind(runner.slow());
    person.setText(personWords(station.who().get()));
    station.who().addListener((_, _, now) -> person.setText(personWords(now)));
    theme.setText(words.say("window.keys"));
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    book.setMinWidth(60);
    HBox foot = new HBox(book, where, person, busy, between, theme);
    for (Label each : List.of(where, person, theme)) {
      each.setMinWidth(Region.USE_PREF_SIZE);
    }
    foot.getStyleClass().add("foot");
    foot.setAlignment(Pos.CENTER_LEFT);
    return foot;
  }

  private String personWords(@Nullable Person who) {
    return who == null
        ? words.say("window.nobody")
        : words.say("window.person", who.initials(), who.name());
  }

  /// Goes to a room.
  ///
  /// @param key the room
  /// @param code the number to open there, or null
  public void open(String key, @Nullable String code) {
    Room room = rooms.get(key);
    if (room == null) {
      return;
    }
    here = room;
    doors.forEach(
        (name, door) -> {
          door.getStyleClass().remove("here");
          if (name.equals(key)) {
            door.getStyleClass().add("here");
          }
        });
    said.set(Said.NOTHING);
    middle.getChildren().setAll(room.node());
    room.enter(code);
  }

  private void find() {
    String typed = number.getText();
    if (typed.isBlank()) {
      return;
    }
    runner.run(
        words.say("doing.find"),
        () -> finder.find(typed),
        place -> {
          number.clear();
          open(rooms.containsKey(place.room()) ? place.room() : "trace", place.code());
        },
        this::tell);
  }

  private void tell(Trouble trouble) {
    said.set(Said.of(trouble));
  }

  private void anywhere(KeyEvent event) {
    if (event.getCode() == KeyCode.F1) {
      help();
      event.consume();
    } else if (event.isControlDown() && event.getCode() == KeyCode.F) {
      number.requestFocus();
      number.selectAll();
      event.consume();
    } else if (event.isControlDown() && event.getCode() == KeyCode.L) {
      List<Theme> all = List.of(Theme.values());
      look.set(new Look(all.get((all.indexOf(look.get().theme()) + 1) % all.size())));
      event.consume();
    } else if (event.isControlDown() && event.getCode().isDigitKey()) {
      int index = Math.floorMod(event.getCode().getCode() - KeyCode.DIGIT1.getCode(), 10);
      List<String> keys = List.copyOf(rooms.keySet());
      if (index < keys.size()) {
        open(keys.get(index), null);
        event.consume();
      }
    }
  }

  private void help() {
    question.choose(words.say("window.help"), List.of(), words.say("window.help.close"));
  }

  /// Asks who is at this station.
  public void askWho() {
    runner.run(
        words.say("doing.look"),
        () ->
            station.with(
                book -> new People(book).list().stream().filter(p -> !p.retired()).toList()),
        people -> {
          List<Question.Choice> choices = new ArrayList<>();
          for (Person each : people) {
            choices.add(
                new Question.Choice(
                    each.initials() + "  " + each.name(), () -> station.takenBy(each)));
          }
          question.choose(words.say("who.question"), choices, words.say("who.nobody"));
        },
        this::tell);
  }

  /// Looks whether somebody changed the book, and shows the room as it is now.
  void lookForChanges() {
    if (waiting) {
      return;
    }
    waiting = true;
    runner.run(
        words.say("doing.look"),
        watch::changed,
        changed -> {
          waiting = false;
          looked = true;
          if (changed && here != null) {
            here.refresh();
          }
        },
        trouble -> {
          waiting = false;
          tell(trouble);
        });
  }

  /// Whether the book was looked at since the window opened, so that changes are seen from now on.
  boolean looked() {
    return looked;
  }
}
