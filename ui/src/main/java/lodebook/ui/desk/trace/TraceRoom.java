package lodebook.ui.desk.trace;

import java.time.Instant;
import java.util.List;
import javafx.beans.property.ObjectProperty;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.TreeCell;
import javafx.scene.control.TreeItem;
import javafx.scene.control.TreeView;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import lodebook.db.trace.TraceNode;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.ring.RingControl;
import lodebook.ui.desk.room.Doors;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.room.Room;
import lodebook.ui.desk.room.Slip;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// A number in the middle, what it was made from on its left, where it went on its right.
public final class TraceRoom implements Room {
  private static final int OPENED = 2;
  private static final double RING = 300;

  private final TraceModel model;
  private final DeskWords words;
  private final Doors doors;
  private final TextField code = new TextField();
  private final TreeView<TraceNode> madeFrom = new TreeView<>();
  private final TreeView<TraceNode> wentInto = new TreeView<>();
  private final RingControl ring;
  private final VBox thing = new VBox(8);
  private final HBox trees = new HBox(14);
  private final VBox node;

  /// @param model what is traced
  /// @param words the desktop's language
  /// @param look the theme in force
  /// @param doors the way to other rooms
  public TraceRoom(TraceModel model, DeskWords words, ObjectProperty<Look> look, Doors doors) {
    this.model = model;
    this.words = words;
    this.doors = doors;
    this.ring = new RingControl(words, look);
    ring.setPrefSize(RING, RING);
    code.setPromptText(words.say("trace.field"));
    code.setId("trace-code");
    code.setPrefWidth(320);
    code.setOnAction(_ -> start());
    Button go = Keys.key(words.say("trace.go"), this::start, "call", "small-key");
    HBox line = new HBox(10, code, go);
    line.setAlignment(Pos.CENTER);
    thing.setAlignment(Pos.TOP_CENTER);
    thing.setMinWidth(RING);
    thing.setPrefWidth(RING);
    VBox left = side("trace.made-from", madeFrom);
    VBox right = side("trace.went-into", wentInto);
    trees.getChildren().setAll(left, thing, right);
    VBox.setVgrow(trees, Priority.ALWAYS);
    Slip slip = new Slip(model.said());
    slip.setMaxWidth(720);
    node = new VBox(12, line, slip, trees);
    node.setAlignment(Pos.TOP_CENTER);
    node.setPadding(new Insets(18, 18, 12, 18));
    model.traced().addListener((_, _, _) -> show());
    show();
  }

  private VBox side(String key, TreeView<TraceNode> tree) {
    tree.setShowRoot(false);
    tree.setCellFactory(_ -> new ThingCell());
    tree.setOnMouseClicked(
        event -> {
          if (event.getClickCount() == 2) {
            follow(tree);
          }
        });
    tree.setOnKeyPressed(
        event -> {
          if (event.getCode() == KeyCode.ENTER) {
            follow(tree);
          }
        });
    tree.setAccessibleText(words.say(key));
    Label none = Keys.words(words.say("trace.nothing"), "quiet");
    none.visibleProperty().bind(tree.visibleProperty().not());
    StackPane either = new StackPane(tree, none);
    StackPane.setAlignment(none, Pos.TOP_LEFT);
    VBox.setVgrow(either, Priority.ALWAYS);
    VBox side = new VBox(4, Keys.words(words.say(key), "heading"), either);
    HBox.setHgrow(side, Priority.ALWAYS);
    side.setPrefWidth(380);
    return side;
  }

  private final class ThingCell extends TreeCell<TraceNode> {
    ThingCell() {
      setWrapText(true);
      setPrefWidth(0);
    }

    @Override
    protected void updateItem(TraceNode item, boolean empty) {
      super.updateItem(item, empty);
      setText(empty || item == null ? null : line(item));
    }
  }

  private String line(TraceNode node) {
    String thing = words.say("trace.thing", node.code(), kind(node.kind()), state(node.state()));
    Integer magnets = node.magnets();
    String text =
        magnets == null ? thing : words.say("trace.magnets", thing, words.number(magnets));
    Instant from = node.from();
    if (from == null) {
      return text;
    }
    Instant to = node.to();
    return to == null
        ? words.say("trace.since", text, day(from))
        : words.say("trace.from-to", text, day(from), day(to));
  }

  private String day(Instant time) {
    return words.day(words.dayOf(time));
  }

  private String kind(String kind) {
    return words.say("kind." + kind.replace(' ', '-'));
  }

  private static String state(String state) {
    return state.isEmpty() ? "" : ", " + state;
  }

  private void follow(TreeView<TraceNode> tree) {
    TreeItem<TraceNode> chosen = tree.getSelectionModel().getSelectedItem();
    if (chosen != null) {
      model.trace(chosen.getValue().code());
    }
  }

  private void start() {
    if (!code.getText().isBlank()) {
      model.trace(code.getText());
    }
  }

  private void show() {
    TraceModel.Traced traced = model.traced().get();
    trees.setVisible(traced != null);
    if (traced == null) {
      return;
    }
    madeFrom.setRoot(root(traced.trace().madeFrom()));
    wentInto.setRoot(root(traced.trace().wentInto()));
    madeFrom.setVisible(!traced.trace().madeFrom().isEmpty());
    wentInto.setVisible(!traced.trace().wentInto().isEmpty());
    thing.getChildren().clear();
    thing.getChildren().add(Keys.words(traced.trace().code(), "title"));
    String kind = kind(traced.trace().kind()) + state(traced.trace().state());
    thing.getChildren().add(Keys.words(kind, "quiet"));
    Instant at = traced.trace().at();
    if (at != null) {
      thing.getChildren().add(Keys.words(words.say("trace.at", words.minute(at)), "quiet"));
    }
    if (traced.ring() != null) {
      ring.picture().set(traced.ring());
      thing.getChildren().add(ring);
    }
    thing
        .getChildren()
        .add(
            Keys.link(
                words.say("trace.history"), () -> doors.open("history", traced.trace().code())));
    if (!traced.trace().others().isEmpty()) {
      List<String> others = traced.trace().others().stream().map(TraceNode::code).toList();
      thing
          .getChildren()
          .add(Keys.words(words.say("trace.others", String.join(", ", others)), "quiet"));
    }
  }

  private static TreeItem<TraceNode> root(List<TraceNode> nodes) {
    TreeItem<TraceNode> root =
        new TreeItem<>(new TraceNode("", "", null, "", null, null, null, List.of()));
    nodes.forEach(n -> root.getChildren().add(item(n, 1)));
    root.setExpanded(true);
    return root;
  }

  private static TreeItem<TraceNode> item(TraceNode node, int depth) {
    TreeItem<TraceNode> item = new TreeItem<>(node);
    node.branches().forEach(b -> item.getChildren().add(item(b, depth + 1)));
    item.setExpanded(depth < OPENED);
    return item;
  }

  @Override
  public String key() {
    return "trace";
  }

  @Override
  public Node node() {
    return node;
  }

  @Override
  public void enter(@Nullable String number) {
    if (number != null) {
      code.setText(number);
      model.trace(number);
    } else {
      code.requestFocus();
    }
  }

  @Override
  public void refresh() {
    model.again();
  }
}
