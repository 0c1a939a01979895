package lodebook.ui.desk.survey;

import java.util.List;
import javafx.beans.property.ObjectProperty;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextField;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.FaultKind;
import lodebook.assembly.survey.Finding;
import lodebook.db.builds.RecordedPlacement;
import lodebook.db.surveys.FluxUnit;
import lodebook.db.surveys.Survey;
import lodebook.reports.ring.ShownReading;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.ring.RingControl;
import lodebook.ui.desk.room.FileDrop;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.room.Question;
import lodebook.ui.desk.room.Room;
import lodebook.ui.desk.room.Slip;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// A round of readings about its ring: the band, the verdict, what to do.
public final class SurveyRoom implements Room {
  private static final double SLIP = 880;

  private final SurveyModel model;
  private final DeskWords words;
  private final SurveyPictures pictures;
  private final StackPane ground = new StackPane();
  private final Question question = new Question(ground);
  private final RingControl ring;
  private final TextField reading = new TextField();
  private final Button unit;
  private final Label story = Keys.words("", "quiet");
  private final Label ask = Keys.words("", "ask");
  private final Slip slip;

  /// @param model what happens
  /// @param look the theme in force
  public SurveyRoom(SurveyModel model, ObjectProperty<Look> look) {
    this.model = model;
    this.words = model.words();
    this.pictures = new SurveyPictures(words);
    this.ring = new RingControl(words, look);
    this.slip = new Slip(model.said());
    this.unit = Keys.key(model.unit().get().word(), this::nextUnit, "unit");
    ground.getStyleClass().addAll("bench", "low");
    slip.setMaxWidth(SLIP);
    reading.getStyleClass().add("reading");
    reading.setId("survey-reading");
    reading.textProperty().bindBidirectional(model.typed());
    reading.setOnAction(_ -> model.enter());
    reading.setAccessibleText(words.say("bench.field"));
    model.unit().addListener((_, _, now) -> unit.setText(now.word()));
    model.round().addListener((_, _, _) -> show());
    model.asked().addListener((_, _, _) -> show());
    model
        .choices()
        .addListener(
            (javafx.collections.ListChangeListener<SurveyBook.Choice>)
                _ -> {
                  if (model.round().get() == null) {
                    show();
                  }
                });
    ring.whenTouched(this::touched);
    ring.tellsOf(this::story);
    FileDrop.onto(ground, model::file);
  }

  @Override
  public String key() {
    return "survey";
  }

  @Override
  public Node node() {
    return ground;
  }

  @Override
  public void enter(@Nullable String code) {
    if (code != null) {
      model.open(code);
    } else if (model.round().get() == null) {
      model.offer();
      show();
    }
  }

  @Override
  public void refresh() {
    if (model.round().get() == null) {
      model.offer();
    }
  }

  @Override
  public boolean unfinished() {
    return !model.typed().get().isBlank();
  }

  private void show() {
    Round round = model.round().get();
    ground.getChildren().setAll(round == null ? choice() : work(round));
    if (round != null && model.asked().get() != null) {
      reading.requestFocus();
    }
  }

  private Node choice() {
    VBox tiles = new VBox(10);
    tiles.setAlignment(Pos.TOP_CENTER);
    for (SurveyBook.Choice choice : model.choices()) {
      Survey survey = choice.survey();
      String state =
          survey == null
              ? words.say("survey.none")
              : words.say("survey.latest", survey.code(), verdict(survey));
      String code = choice.rotor().code();
      Button tile =
          Keys.key(
              words.say("survey.tile", code, choice.rotor().layout(), state),
              () -> model.open(code),
              "tile");
      tile.setMaxWidth(620);
      tiles.getChildren().add(tile);
    }
    String title = model.choices().isEmpty() ? "survey.nobody" : "survey.which";
    VBox all = new VBox(14, Keys.words(words.say(title), "title"), slip, tiles);
    all.setAlignment(Pos.TOP_CENTER);
    all.setMaxWidth(700);
    all.setPadding(new Insets(26, 18, 18, 18));
    StackPane middle = new StackPane(all);
    StackPane.setAlignment(all, Pos.TOP_CENTER);
    ScrollPane scroll = new ScrollPane(middle);
    scroll.setFitToWidth(true);
    scroll.setFocusTraversable(false);
    return scroll;
  }

  private String verdict(Survey survey) {
    if (survey.voided()) {
      return words.say("survey.void");
    }
    return survey.verdict() == null
        ? words.say("survey.unjudged")
        : words.say("survey.verdict." + survey.verdict().word().replace(' ', '-'));
  }

  private Node work(Round round) {
    ring.picture().set(pictures.of(round));
    ProbePoint point = model.asked().get();
    ring.chosen().set(point == null ? firstFinding(round) : point.slot());
    ring.top().set(point == null ? 0 : point.slot());
    story.setText(chosenStory());
    VBox beneath = new VBox(6);
    beneath.setAlignment(Pos.TOP_CENTER);
    beneath.setPadding(new Insets(0, 22, 8, 22));
    if (point != null) {
      ask.setText(askWords(round, point));
      HBox line = new HBox(14, reading, unit);
      line.setAlignment(Pos.CENTER);
      beneath.getChildren().addAll(ask, line);
    }
    beneath.getChildren().addAll(slip, story, keys(round, point));
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    HBox top =
        new HBox(
            12,
            Keys.words(head(round), "quiet"),
            between,
            Keys.link(words.say("survey.others"), model::offer));
    top.setPadding(new Insets(6, 22, 0, 22));
    BorderPane all = new BorderPane(ring, top, null, beneath, null);
    beneath.setMinHeight(Region.USE_PREF_SIZE);
    return all;
  }

  private static int firstFinding(Round round) {
    Diagnosis diagnosis = round.diagnosis();
    return diagnosis == null || diagnosis.findings().isEmpty()
        ? 0
        : diagnosis.findings().getFirst().slot();
  }

  private String head(Round round) {
    Survey survey = round.survey();
    int all = Round.points(round.rotor().design().layout()).size();
    return survey == null
        ? words.say("survey.head.new", round.code(), round.rotor().rotor().layout())
        : words.say(
            "survey.head",
            round.code(),
            survey.code(),
            words.number(all - round.missing().size()),
            words.number(all));
  }

  private String askWords(Round round, ProbePoint point) {
    for (ShownReading each : round.band()) {
      if (each.point().equals(point)) {
        return words.say(
            "survey.ask",
            model.sentences().point(point),
            words.milliTesla(each.expectedTesla()),
            words.milliTesla(each.bandTesla()));
      }
    }
    return model.sentences().point(point);
  }

  private FlowPane keys(Round round, @Nullable ProbePoint point) {
    FlowPane keys = new FlowPane(10, 8);
    keys.setAlignment(Pos.CENTER);
    Diagnosis diagnosis = round.diagnosis();
    Finding first =
        diagnosis == null || diagnosis.findings().isEmpty()
            ? null
            : diagnosis.findings().getFirst();
    if (first != null && turnable(first.kind())) {
      String slot = words.number(first.slot());
      add(keys, words.say("survey.reworked", slot), model::reworked, "call");
    }
    if (point == null) {
      boolean more = diagnosis != null && !diagnosis.measureNext().isEmpty();
      if (more || !round.missing().isEmpty()) {
        add(keys, words.say("survey.go-on"), model::goOn);
      }
      add(keys, words.say("survey.fresh"), model::fresh).setId("fresh");
    } else if (!round.readings().isEmpty()) {
      add(keys, words.say("survey.judge"), model::judge);
    }
    if (round.survey() != null) {
      add(keys, words.say("survey.move"), this::move);
      add(keys, words.say("survey.make-void"), this::makeVoid);
    }
    return keys;
  }

  private static boolean turnable(FaultKind kind) {
    return switch (kind) {
      case REVERSED, QUARTER_TURN_FORWARD, QUARTER_TURN_BACK, TURNED -> true;
      case MISSING, WEAK, STRONG, SUSPECT_READING -> false;
    };
  }

  private Button add(FlowPane keys, String text, Runnable action, String... styles) {
    Button key = Keys.key(text, action, styles);
    key.disableProperty().bind(model.busy());
    keys.getChildren().add(key);
    return key;
  }

  private void move() {
    question.line(
        words.say("survey.move.question"),
        words.say("survey.move.hint"),
        words.say("survey.move"),
        words.say("never-mind"),
        model::moved);
  }

  private void makeVoid() {
    question.line(
        words.say("survey.void.question"),
        words.say("survey.void.hint"),
        words.say("survey.make-void"),
        words.say("never-mind"),
        model::voided);
  }

  private void touched(int slot) {
    if (model.asked().get() != null && model.typed().get().isBlank()) {
      model.ask(slot);
    }
    story.setText(chosenStory());
  }

  private String chosenStory() {
    int slot = ring.chosen().get();
    return slot == 0 ? "" : story(slot);
  }

  /// What a slot holds, what it should read and what it reads.
  private String story(int slot) {
    Round round = model.round().get();
    if (round == null) {
      return "";
    }
    StringBuilder told = new StringBuilder();
    for (RecordedPlacement placement : round.rotor().standing()) {
      if (placement.slot() == slot) {
        told.append(
            words.say(
                "survey.slot",
                words.number(slot),
                placement.magnet(),
                model
                    .sentences()
                    .facing(round.rotor().design().layout(), slot, placement.facing())));
      }
    }
    List<ShownReading> here = round.band().stream().filter(r -> r.point().slot() == slot).toList();
    for (ShownReading each : here) {
      Double read = each.readTesla();
      told.append(
          words.say(
              read == null ? "survey.slot.expected" : "survey.slot.read",
              model.sentences().component(each.point().component()),
              words.milliTesla(each.expectedTesla()),
              read == null ? "" : words.milliTesla(read)));
    }
    return told.toString();
  }

  private void nextUnit() {
    List<FluxUnit> all = List.of(FluxUnit.values());
    model.unit().set(all.get((all.indexOf(model.unit().get()) + 1) % all.size()));
    reading.requestFocus();
  }
}
