package lodebook.ui.desk.waiting;

import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import lodebook.ui.desk.room.Doors;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.room.Room;
import lodebook.ui.desk.room.Slip;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// What waits, a line for each kind; each thing opens the place where it is dealt with.
public final class WaitingRoom implements Room {
  private static final double WIDTH = 860;
  private static final int MOST = 24;

  private final WaitingModel model;
  private final DeskWords words;
  private final Doors doors;
  private final VBox rows = new VBox();
  private final ScrollPane node;

  /// @param model what waits
  /// @param words the desktop's language
  /// @param doors the way to other rooms
  public WaitingRoom(WaitingModel model, DeskWords words, Doors doors) {
    this.model = model;
    this.words = words;
    this.doors = doors;
    rows.getStyleClass().add("rows");
    VBox sheet =
        new VBox(12, Keys.words(words.say("waiting.title"), "title"), new Slip(model.said()), rows);
    sheet.setMaxWidth(WIDTH);
    sheet.setPadding(new Insets(26, 18, 18, 18));
    StackPane middle = new StackPane(sheet);
    StackPane.setAlignment(sheet, Pos.TOP_CENTER);
    node = new ScrollPane(middle);
    node.setFitToWidth(true);
    node.setFocusTraversable(false);
    model.lines().addListener((javafx.collections.ListChangeListener<WaitingLine>) _ -> show());
  }

  @Override
  public String key() {
    return "waiting";
  }

  @Override
  public Node node() {
    return node;
  }

  @Override
  public void enter(@Nullable String code) {
    model.look();
  }

  @Override
  public void refresh() {
    model.look();
  }

  private void show() {
    rows.getChildren().clear();
    for (WaitingLine line : model.lines()) {
      rows.getChildren().add(row(line));
    }
  }

  private Node row(WaitingLine line) {
    Label count = new Label(words.number(line.things().size()));
    count.getStyleClass().add("count");
    FlowPane things = new FlowPane(8, 6);
    line.things().stream().limit(MOST).forEach(thing -> things.getChildren().add(key(thing)));
    if (line.things().size() > MOST) {
      things
          .getChildren()
          .add(
              Keys.words(
                  words.say("waiting.more", words.number(line.things().size() - MOST)), "quiet"));
    }
    VBox story = new VBox(5, Keys.words(words.say("waiting." + line.key()), "strong"), things);
    HBox.setHgrow(story, Priority.ALWAYS);
    HBox row = new HBox(count, story);
    row.getStyleClass().add("row");
    row.setAlignment(Pos.TOP_LEFT);
    return row;
  }

  private Button key(WaitingLine.Thing thing) {
    Button key = Keys.key(thing.text(), () -> doors.open(thing.room(), thing.code()), "small-key");
    key.setAccessibleText(thing.text());
    return key;
  }
}
