package lodebook.ui.desk.bench;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javafx.animation.Animation;
import javafx.animation.KeyFrame;
import javafx.animation.Timeline;
import javafx.beans.property.ObjectProperty;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.util.Duration;
import lodebook.db.builds.Rotor;
import lodebook.db.meters.Meter;
import lodebook.db.surveys.FluxUnit;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.ring.RingControl;
import lodebook.ui.desk.room.Doors;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.room.Question;
import lodebook.ui.desk.room.Room;
import lodebook.ui.desk.room.Slip;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// The bench on the screen: the ring with the slot on top, one sentence, one field.
public final class BenchRoom implements Room {
  private static final int LONG_SENTENCE = 44;
  private static final double SLIP = 820;
  private static final double NARROW_SLIP = 330;
  private static final double LOW = 640;

  private final BenchModel model;
  private final DeskWords words;
  private final Doors doors;
  private final BenchPictures pictures;
  private final StackPane ground = new StackPane();
  private final Question question = new Question(ground);
  private final RingControl ring;
  private final TextField reading = new TextField();
  private final Button unit;
  private final Label place = Keys.words("", "quiet");
  private final Label minutes = new Label();
  private final Label sentence = Keys.words("", "sentence");
  private final Label warning = Keys.words("", "warning");
  private final Label ask = Keys.words("", "ask");
  private final Label last = new Label();
  private final Slip slip;
  private final FlowPane keys = new FlowPane(10, 8);
  private final Map<KeyCode, Button> byKey = new LinkedHashMap<>();

  /// @param model what happens at the bench
  /// @param look the theme in force
  /// @param doors the way to other rooms
  public BenchRoom(BenchModel model, ObjectProperty<Look> look, Doors doors) {
    this.model = model;
    this.words = model.desk();
    this.doors = doors;
    this.pictures = new BenchPictures(words);
    this.ring = new RingControl(words, look);
    this.slip = new Slip(model.said());
    this.unit = Keys.key("", this::nextUnit, "unit");
    ground.getStyleClass().add("bench");
    minutes.getStyleClass().add("minutes");
    last.getStyleClass().add("last");
    reading.getStyleClass().add("reading");
    reading.setId("reading");
    reading.textProperty().bindBidirectional(model.typed());
    reading.setOnAction(_ -> model.enter());
    reading.setAccessibleText(words.say("bench.field"));
    minutes.textProperty().bind(model.minutes());
    model.phase().addListener((_, _, _) -> show());
    model.step().addListener((_, _, _) -> show());
    model.doubt().addListener((_, _, _) -> show());
    model.unit().addListener((_, _, now) -> unit.setText(now.word()));
    model.last().addListener((_, _, now) -> last.setText(lastWords(now)));
    model.rotors().addListener((javafx.collections.ListChangeListener<Rotor>) _ -> offered());
    model.meters().addListener((javafx.collections.ListChangeListener<Meter>) _ -> offered());
    unit.setText(model.unit().get().word());
    ground.addEventFilter(KeyEvent.KEY_PRESSED, this::functionKey);
    Timeline seconds = new Timeline(new KeyFrame(Duration.seconds(1), _ -> model.tick()));
    seconds.setCycleCount(Animation.INDEFINITE);
    ground
        .sceneProperty()
        .addListener(
            (_, _, scene) -> {
              if (scene == null) {
                seconds.stop();
              } else {
                seconds.play();
              }
            });
    ground
        .heightProperty()
        .addListener(
            (_, _, height) -> {
              ground.getStyleClass().remove("low");
              if (height.doubleValue() < LOW) {
                ground.getStyleClass().add("low");
              }
            });
    show();
  }

  @Override
  public String key() {
    return "bench";
  }

  @Override
  public Node node() {
    return ground;
  }

  @Override
  public void enter(@Nullable String code) {
    if (code != null) {
      model.sitDown(code);
    } else if (model.rotor().isEmpty()) {
      model.offer();
    }
  }

  @Override
  public void refresh() {
    if (model.phase().get() == BenchPhase.CHOOSE) {
      model.fetchOffer();
    }
  }

  @Override
  public boolean unfinished() {
    return !model.typed().get().isBlank();
  }

  private void offered() {
    if (model.phase().get() == BenchPhase.CHOOSE) {
      show();
    }
  }

  private void show() {
    BenchPhase phase = model.phase().get();
    byKey.clear();
    keys.getChildren().clear();
    ground.getChildren().setAll(phase == BenchPhase.CHOOSE ? choice() : atWork(phase));
    if (phase == BenchPhase.STEP) {
      reading.requestFocus();
    } else if (!keys.getChildren().isEmpty()) {
      keys.getChildren().getFirst().requestFocus();
    }
  }

  private Node choice() {
    VBox tiles = new VBox(10);
    tiles.setAlignment(Pos.TOP_CENTER);
    for (Rotor rotor : model.rotors()) {
      String key = rotor.planned() ? "bench.tile" : "bench.tile.unplanned";
      Button tile =
          Keys.key(
              words.say(
                  key,
                  rotor.code(),
                  rotor.layout(),
                  words.number(rotor.filled()),
                  words.number(rotor.slots())),
              () -> model.sitDown(rotor.code()),
              "tile");
      tile.setMaxWidth(620);
      tiles.getChildren().add(tile);
    }
    boolean none = model.rotors().isEmpty();
    VBox all =
        new VBox(
            14,
            Keys.words(words.say(none ? "bench.none" : "bench.which"), "title"),
            meterLine(),
            slip,
            tiles);
    all.setAlignment(Pos.TOP_CENTER);
    all.setMaxWidth(700);
    all.setPadding(new javafx.geometry.Insets(26, 18, 18, 18));
    StackPane middle = new StackPane(all);
    StackPane.setAlignment(all, Pos.TOP_CENTER);
    ScrollPane scroll = new ScrollPane(middle);
    scroll.setFitToWidth(true);
    scroll.setFocusTraversable(false);
    return scroll;
  }

  private Node meterLine() {
    Meter held = model.meter().get();
    String text =
        held == null
            ? words.say("bench.no-meter")
            : words.say("bench.meter", held.code(), model.unit().get().word());
    HBox line = new HBox(12, Keys.words(text, "quiet"));
    line.setAlignment(Pos.CENTER);
    if (model.meters().size() > 1) {
      line.getChildren().add(Keys.link(words.say("bench.other-meter"), this::chooseMeter));
    }
    return line;
  }

  private void chooseMeter() {
    List<Question.Choice> choices = new ArrayList<>();
    model
        .meters()
        .forEach(
            m ->
                choices.add(
                    new Question.Choice(
                        m.code(),
                        () -> {
                          model.meter().set(m);
                          show();
                        })));
    question.choose(words.say("bench.which-meter"), choices, words.say("never-mind"));
  }

  private Node atWork(BenchPhase phase) {
    BenchStep step = model.step().get();
    boolean stepping = step != null && phase == BenchPhase.STEP;
    boolean doubting = step != null && phase == BenchPhase.DOUBT;
    if (step != null) {
      ring.picture().set(pictures.of(step, doubting ? model.doubt().get() : null));
      ring.top().set(step.slot());
      ring.chosen().set(step.slot());
      ring.large().set(stepping ? step.facing() : null);
      place.setText(model.words().place(step));
      String said = model.words().sentence(step);
      sentence.setText(said);
      sentence.getStyleClass().remove("long");
      if (said.length() > LONG_SENTENCE) {
        sentence.getStyleClass().add("long");
      }
      warning.setText(step.warning());
      ask.setText(stepping ? model.words().ask(step) : "");
      String told = said;
      ring.tellsOf(slot -> slot == step.slot() ? told : "");
    }
    VBox story = new VBox(6);
    story.setAlignment(Pos.TOP_CENTER);
    story.setPadding(new javafx.geometry.Insets(0, 22, 8, 22));
    if (stepping) {
      story.getChildren().addAll(sentence, hints(step), field());
      stepKeys();
    } else if (doubting) {
      doubtKeys();
    } else {
      otherKeys(phase);
    }
    if (!stepping) {
      slip.setMaxWidth(SLIP);
      story.getChildren().add(slip);
    }
    story.getChildren().add(keys);
    keys.setAlignment(Pos.CENTER);
    story.setMinHeight(Region.USE_PREF_SIZE);
    BorderPane all = new BorderPane();
    if (step != null) {
      Region between = new Region();
      HBox.setHgrow(between, Priority.ALWAYS);
      HBox line = new HBox(12, place, between, minutes);
      line.setAlignment(Pos.CENTER_LEFT);
      line.setPadding(new javafx.geometry.Insets(6, 22, 0, 22));
      all.setTop(line);
      all.setCenter(ring);
    } else {
      story.setPadding(new javafx.geometry.Insets(60, 22, 8, 22));
    }
    all.setBottom(step == null ? null : story);
    if (step == null) {
      all.setCenter(story);
    }
    return all;
  }

  private Node hints(BenchStep step) {
    FlowPane line = new FlowPane(26, 2);
    line.setAlignment(Pos.CENTER);
    if (!step.warning().isEmpty()) {
      line.getChildren().add(warning);
    }
    line.getChildren().add(ask);
    return line;
  }

  private Node field() {
    unit.setAccessibleText(words.say("bench.unit", model.unit().get().word()));
    slip.setMaxWidth(NARROW_SLIP);
    HBox line = new HBox(14, reading, unit, last, slip);
    last.setMinWidth(Region.USE_PREF_SIZE);
    line.setAlignment(Pos.CENTER);
    return line;
  }

  private String lastWords(String text) {
    return text.isEmpty() ? "" : words.say("bench.last", text);
  }

  private void stepKeys() {
    key(KeyCode.F2, "bench.broken", model::broken);
    key(KeyCode.F3, "bench.another", this::another);
    key(KeyCode.F4, "bench.unread", model::unread);
    BenchStep step = model.step().get();
    if (step != null && step.design().layout().adhesiveWorkingMinutes() != null) {
      key(KeyCode.F6, "bench.mixed", model::mixedNow);
    }
    key(KeyCode.F7, "bench.somebody", this::somebody);
    key(KeyCode.F8, "bench.pause", model::offer);
  }

  private void doubtKeys() {
    key(KeyCode.F9, "bench.turned", model::turned).getStyleClass().add("call");
    key(KeyCode.F5, "bench.again", model::readAgain);
    key(KeyCode.F2, "bench.broken", model::broken);
    key(KeyCode.F3, "bench.another", this::another);
    key(KeyCode.F10, "bench.go-on", model::goOn);
  }

  private void otherKeys(BenchPhase phase) {
    switch (phase) {
      case FULL ->
          key(KeyCode.F9, "bench.survey", () -> doors.open("survey", model.rotor()))
              .getStyleClass()
              .add("call");
      case SPOILT ->
          key(KeyCode.F9, "bench.plan-anew", model::planAnew).getStyleClass().add("call");
      case UNPLANNED -> key(KeyCode.F9, "bench.plan", model::planAnew).getStyleClass().add("call");
      case CHOOSE, STEP, DOUBT -> {}
    }
    key(KeyCode.F8, "bench.pause", model::offer);
  }

  private Button key(KeyCode code, String text, Runnable action) {
    Button key = Keys.key(code.getName() + "  " + words.say(text), action);
    key.setId(text.replace('.', '-'));
    key.disableProperty().bind(model.busy());
    byKey.put(code, key);
    keys.getChildren().add(key);
    return key;
  }

  private void functionKey(KeyEvent event) {
    Button key = byKey.get(event.getCode());
    if (key != null) {
      key.fire();
      event.consume();
    }
  }

  private void another() {
    question.line(
        words.say("bench.another.question"),
        words.say("bench.another.hint"),
        words.say("bench.another.take"),
        words.say("never-mind"),
        model::usedAnother);
  }

  private void somebody() {
    List<Question.Choice> choices = new ArrayList<>();
    model
        .people()
        .forEach(
            p ->
                choices.add(
                    new Question.Choice(p.initials() + "  " + p.name(), () -> model.handOver(p))));
    question.choose(words.say("who.question"), choices, words.say("never-mind"));
  }

  private void nextUnit() {
    List<FluxUnit> all = List.of(FluxUnit.values());
    model.unit().set(all.get((all.indexOf(model.unit().get()) + 1) % all.size()));
    reading.requestFocus();
  }
}
