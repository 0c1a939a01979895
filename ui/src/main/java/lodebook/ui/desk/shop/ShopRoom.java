package lodebook.ui.desk.shop;

import java.io.File;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextField;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.stage.FileChooser;
import lodebook.db.meters.Meter;
import lodebook.db.rights.Person;
import lodebook.db.rights.Role;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.room.Question;
import lodebook.ui.desk.room.Room;
import lodebook.ui.desk.room.Slip;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// The shop on one sheet: people, meters, its name, its backups.
public final class ShopRoom implements Room {
  private static final double WIDTH = 900;

  private final ShopModel model;
  private final DeskWords words;
  private final StackPane ground = new StackPane();
  private final Question question = new Question(ground);
  private final VBox sheet = new VBox(8);
  private final Slip slip;

  /// @param model the shop
  public ShopRoom(ShopModel model) {
    this.model = model;
    this.words = model.words();
    this.slip = new Slip(model.said());
    sheet.setMaxWidth(WIDTH);
    sheet.setPadding(new Insets(20, 18, 24, 18));
    StackPane middle = new StackPane(sheet);
    StackPane.setAlignment(sheet, Pos.TOP_CENTER);
    ScrollPane scroll = new ScrollPane(middle);
    scroll.setFitToWidth(true);
    scroll.setFocusTraversable(false);
    ground.getChildren().add(scroll);
    model.shop().addListener((_, _, now) -> show(now));
  }

  @Override
  public String key() {
    return "shop";
  }

  @Override
  public Node node() {
    return ground;
  }

  @Override
  public void enter(@Nullable String code) {
    model.look();
  }

  @Override
  public void refresh() {
    boolean typing =
        sheet.lookupAll(".text-field").stream()
            .anyMatch(n -> n instanceof TextField field && !field.getText().isBlank());
    if (!typing) {
      model.look();
    }
  }

  private void show(ShopModel.@Nullable Shop shop) {
    if (shop == null) {
      return;
    }
    String title = shop.name().isEmpty() ? words.say("shop.unnamed") : shop.name();
    HBox head = new HBox(12, Keys.words(title, "title"), between());
    head.setAlignment(Pos.CENTER_LEFT);
    head.getChildren()
        .addAll(
            Keys.key(words.say("shop.name"), this::name, "small-key"),
            Keys.key(words.say("shop.backup"), this::backup, "small-key", "call"));
    Label book =
        Keys.words(
            words.say(
                "shop.book",
                shop.info().name(),
                words.minute(shop.info().created()),
                words.number(shop.info().pieces()),
                shop.info().head()),
            "quiet");
    sheet.getChildren().setAll(head, book, slip);
    sheet.getChildren().add(Keys.words(words.say("shop.people"), "heading"));
    shop.people().forEach(p -> sheet.getChildren().add(person(p)));
    sheet.getChildren().add(newPerson());
    sheet.getChildren().add(Keys.words(words.say("shop.meters"), "heading"));
    shop.meters().forEach(m -> sheet.getChildren().add(meter(m)));
    sheet.getChildren().add(newMeter());
  }

  private static Region between() {
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    return between;
  }

  private Node person(Person person) {
    HBox row = new HBox(10);
    row.getStyleClass().add("row");
    Label initials = Keys.words(person.initials(), "strong");
    initials.setMinWidth(60);
    String role = words.say("role." + person.role().word());
    row.getChildren()
        .addAll(
            initials,
            Keys.words(
                words.say(
                    person.retired() ? "shop.person.retired" : "shop.person", person.name(), role)),
            between());
    if (!person.retired()) {
      row.getChildren()
          .addAll(
              Keys.key(words.say("shop.role"), () -> role(person), "small-key"),
              Keys.key(words.say("shop.retire"), () -> retire(person), "small-key"));
    }
    return row;
  }

  private void role(Person person) {
    List<Question.Choice> choices = new ArrayList<>();
    for (Role role : Role.values()) {
      choices.add(
          new Question.Choice(
              words.say("role." + role.word()), () -> model.changeRole(person.initials(), role)));
    }
    question.choose(
        words.say("shop.role.question", person.name()), choices, words.say("never-mind"));
  }

  private void retire(Person person) {
    question.choose(
        words.say("shop.retire.question", person.name()),
        List.of(
            new Question.Choice(words.say("shop.retire"), () -> model.retire(person.initials()))),
        words.say("never-mind"));
  }

  private Node newPerson() {
    TextField initials = field("shop.initials", 90);
    initials.setId("new-initials");
    TextField name = field("shop.full-name", 230);
    name.setId("new-name");
    FlowPane line = new FlowPane(8, 8, initials, name);
    for (Role role : Role.values()) {
      var key =
          Keys.key(
              words.say("shop.add-as", words.say("role." + role.word())),
              () -> model.addPerson(initials.getText(), name.getText(), role),
              "small-key");
      key.setId("add-" + role.word());
      line.getChildren().add(key);
    }
    return line;
  }

  private TextField field(String hint, double width) {
    TextField field = new TextField();
    field.setPromptText(words.say(hint));
    field.setAccessibleText(words.say(hint));
    field.setPrefWidth(width);
    return field;
  }

  private Node meter(Meter meter) {
    HBox row = new HBox(10);
    row.getStyleClass().add("row");
    LocalDate due = meter.calibrationDue();
    row.getChildren()
        .addAll(
            Keys.words(meter.code(), "strong"),
            Keys.words(
                words.say(
                    "shop.meter",
                    words.percent(meter.accuracyRelative(), 1),
                    words.milliTesla(meter.floorTesla()),
                    due == null ? words.say("shop.no-day") : words.day(due))));
    return row;
  }

  private Node newMeter() {
    TextField code = field("shop.meter-code", 120);
    TextField accuracy = field("shop.accuracy", 130);
    TextField floor = field("shop.floor", 130);
    TextField due = field("shop.due", 180);
    return new FlowPane(
        8,
        8,
        code,
        accuracy,
        floor,
        due,
        Keys.key(
            words.say("shop.add-meter"),
            () ->
                model.addMeter(code.getText(), accuracy.getText(), floor.getText(), due.getText()),
            "small-key"));
  }

  private void name() {
    question.line(
        words.say("shop.name.question"),
        words.say("shop.name.hint"),
        words.say("shop.name"),
        words.say("never-mind"),
        model::name);
  }

  private void backup() {
    FileChooser chooser = new FileChooser();
    chooser.setTitle(words.say("shop.backup"));
    chooser.setInitialFileName("lodebook-backup.zip");
    File file = chooser.showSaveDialog(ground.getScene().getWindow());
    if (file != null) {
      model.backup(file.toPath());
    }
  }
}
