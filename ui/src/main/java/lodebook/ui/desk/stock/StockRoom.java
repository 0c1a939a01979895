package lodebook.ui.desk.stock;

import java.util.ArrayList;
import java.util.List;
import javafx.beans.property.ObjectProperty;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TableView;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import lodebook.assembly.magnet.Strength;
import lodebook.db.stock.Lot;
import lodebook.db.stock.Piece;
import lodebook.db.stock.PieceState;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.room.Doors;
import lodebook.ui.desk.room.FileDrop;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.room.Question;
import lodebook.ui.desk.room.Room;
import lodebook.ui.desk.room.Sheets;
import lodebook.ui.desk.room.Slip;
import lodebook.ui.desk.stock.StockBook.Decision;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// The stockroom: all lots on a sheet; a lot with the spread of its remanences; a piece; a tray.
public final class StockRoom implements Room {
  private static final double SLIP_HEIGHT = 260;

  private final StockModel model;
  private final DeskWords words;
  private final Doors doors;
  private final StackPane ground = new StackPane();
  private final Question question = new Question(ground);
  private final HistogramView histogram;
  private final StockWords stockWords;
  private final PieceSheets sheets;
  private final Node slip;

  /// @param model what lies there
  /// @param look the theme in force
  /// @param doors the way to other rooms
  public StockRoom(StockModel model, ObjectProperty<Look> look, Doors doors) {
    this.model = model;
    this.words = model.words();
    this.doors = doors;
    this.histogram = new HistogramView(words, look);
    this.stockWords = new StockWords(words);
    this.sheets = new PieceSheets(words, model::open);
    ScrollPane scroll = new ScrollPane(new Slip(model.said()));
    scroll.setFitToWidth(true);
    scroll.setMaxHeight(SLIP_HEIGHT);
    scroll.setMinHeight(Region.USE_PREF_SIZE);
    model
        .said()
        .addListener(
            (_, _, now) -> {
              scroll.setManaged(!now.silent());
              scroll.setVisible(!now.silent());
              scroll.setPrefHeight(now.rows().size() > 6 ? SLIP_HEIGHT : Region.USE_COMPUTED_SIZE);
            });
    scroll.setManaged(false);
    scroll.setVisible(false);
    scroll.setFocusTraversable(false);
    this.slip = scroll;
    model.page().addListener((_, _, _) -> show());
    ground.setId("stock");
    FileDrop.onto(ground, model::file);
  }

  @Override
  public String key() {
    return "stock";
  }

  @Override
  public Node node() {
    return ground;
  }

  @Override
  public void enter(@Nullable String code) {
    if (code == null) {
      model.everything();
    } else {
      model.open(code);
    }
  }

  @Override
  public void refresh() {
    model.again();
  }

  private void show() {
    Node sheet =
        switch (model.page().get()) {
          case null -> new Region();
          case StockPage.Everything all -> everything(all);
          case StockPage.OneLot lot -> lot(lot);
          case StockPage.OnePiece piece -> piece(piece);
          case StockPage.OneTray tray -> tray(tray);
        };
    ground.getChildren().setAll(sheet);
  }

  private VBox page(Node head, Node... parts) {
    VBox page = new VBox(10, head, slip);
    page.getChildren().addAll(parts);
    page.setPadding(new Insets(16, 18, 12, 18));
    return page;
  }

  private HBox head(String title, boolean back, Node... keys) {
    HBox head = new HBox(10);
    head.setAlignment(Pos.CENTER_LEFT);
    head.getChildren().add(Keys.words(title, "title"));
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    head.getChildren().add(between);
    head.getChildren().addAll(keys);
    if (back) {
      head.getChildren().add(Keys.link(words.say("stock.all"), model::everything));
    }
    return head;
  }

  private Node everything(StockPage.Everything all) {
    TableView<Lot> sheet = Sheets.sheet(words.say("stock.no-lot"), lot -> model.open(lot.code()));
    sheet.getColumns().add(Sheets.words(words.say("stock.lot"), 120, Lot::code));
    sheet.getColumns().add(Sheets.words(words.say("stock.type"), 130, l -> l.received().type()));
    sheet
        .getColumns()
        .add(Sheets.words(words.say("stock.state"), 150, l -> stockWords.lotState(l.state())));
    sheet
        .getColumns()
        .add(
            Sheets.figures(
                words.say("stock.count"), 80, l -> (double) l.received().count(), this::whole));
    sheet
        .getColumns()
        .add(Sheets.figures(words.say("stock.left"), 80, l -> (double) l.left(), this::whole));
    sheet
        .getColumns()
        .add(
            Sheets.figures(
                words.say("stock.measured"), 90, l -> (double) l.measured(), this::whole));
    sheet
        .getColumns()
        .add(
            Sheets.words(
                words.say("stock.received"), 120, l -> words.day(l.received().received())));
    sheet
        .getColumns()
        .add(Sheets.words(words.say("stock.supplier"), 160, l -> l.received().supplier()));
    sheet
        .getColumns()
        .add(Sheets.words(words.say("stock.lies"), 140, l -> l.received().location()));
    sheet.getItems().setAll(all.lots());
    sheet.setId("lots");
    VBox.setVgrow(sheet, Priority.ALWAYS);
    return page(
        head(
            words.say("room.stock"),
            false,
            Keys.words(words.say("stock.drop-lots"), "quiet"),
            Keys.key(words.say("stock.receive"), () -> choose("stock.receive"), "small-key")),
        sheet);
  }

  private String whole(Double figure) {
    return words.number(Math.round(figure));
  }

  private void choose(String title) {
    FileDrop.choose(ground, words.say(title), model::file);
  }

  private Node lot(StockPage.OneLot page) {
    Lot lot = page.lot();
    String code = lot.code();
    List<Node> keys = new ArrayList<>();
    switch (lot.state()) {
      case AWAITING -> {
        keys.add(decision("stock.accept", code, Decision.ACCEPT, "call"));
        keys.add(decision("stock.hold", code, Decision.HOLD));
        keys.add(decision("stock.reject", code, Decision.REJECT));
      }
      case ACCEPTED -> keys.add(decision("stock.hold", code, Decision.HOLD));
      case HELD -> {
        keys.add(decision("stock.free", code, Decision.FREE, "call"));
        keys.add(decision("stock.reject", code, Decision.REJECT));
      }
      case REJECTED -> {}
    }
    keys.add(Keys.key(words.say("stock.recount"), () -> recount(code), "small-key"));
    keys.add(Keys.key(words.say("stock.readings"), () -> choose("stock.readings"), "small-key"));
    keys.add(Keys.key(words.say("stock.trace"), () -> doors.open("trace", code), "small-key"));
    String facts =
        words.say(
            "stock.lot-facts",
            page.type().code(),
            page.type().grade(),
            words.number(lot.received().count()),
            words.number(lot.left()),
            words.number(page.free()),
            words.number(lot.measured()),
            words.number(lot.placed()),
            words.number(lot.scrapped()));
    String origin =
        words.say(
            "stock.lot-origin",
            lot.received().supplier(),
            words.day(lot.received().received()),
            lot.received().certificate());
    histogram.show(page);
    VBox story =
        new VBox(
            3,
            Keys.words(facts),
            Keys.words(origin, "quiet"),
            stockWords.decisions(page.decisions()));
    Node spread =
        lot.measured() == 0 ? Keys.words(words.say("stock.none-measured"), "quiet") : histogram;
    TableView<Piece> pieces = sheets.of(page.pieces());
    VBox.setVgrow(pieces, Priority.ALWAYS);
    FlowPane row = new FlowPane(8, 8);
    row.getChildren().addAll(keys);
    return page(
        head(words.say("stock.lot-title", code, stockWords.lotState(lot.state())), true),
        row,
        story,
        spread,
        pieces);
  }

  private Node decision(String key, String code, Decision decision, String... styles) {
    var made = Keys.key(words.say(key), () -> why(key, code, decision), styles);
    made.getStyleClass().add("small-key");
    made.setId(key);
    return made;
  }

  private void why(String key, String code, Decision decision) {
    question.line(
        words.say("stock.why", words.say(key), code),
        words.say("stock.why.hint"),
        words.say(key),
        words.say("never-mind"),
        why -> model.decide(code, decision, why));
  }

  private void recount(String lot) {
    question.line(
        words.say("stock.recount.question", lot),
        words.say("stock.recount.hint"),
        words.say("stock.recount"),
        words.say("never-mind"),
        count -> model.counted(lot, count, words.say("why.recounted")));
  }

  private Node piece(StockPage.OnePiece page) {
    Piece piece = page.piece();
    String code = piece.name().toString();
    FlowPane keys = new FlowPane(8, 8);
    if (piece.state() == PieceState.USABLE) {
      keys.getChildren().add(decision("stock.hold", code, Decision.HOLD));
    } else if (piece.state() == PieceState.HELD) {
      keys.getChildren().add(decision("stock.free", code, Decision.FREE, "call"));
    }
    if (piece.state() != PieceState.SCRAPPED) {
      keys.getChildren().add(decision("stock.scrap", code, Decision.SCRAP));
    }
    keys.getChildren()
        .add(Keys.key(words.say("stock.trace"), () -> doors.open("trace", code), "small-key"));
    Piece.Cell lies = piece.lies();
    if (lies != null) {
      keys.getChildren()
          .add(
              Keys.key(
                  words.say("stock.tray-of", lies.tray()),
                  () -> model.open(lies.tray()),
                  "small-key"));
    }
    keys.getChildren()
        .add(
            Keys.key(
                words.say("stock.lot-of", piece.name().lot()),
                () -> model.open(piece.name().lot()),
                "small-key"));
    Strength strength = piece.strength();
    String br =
        strength == null
            ? words.say("stock.unmeasured")
            : words.say(
                "stock.strength",
                words.milliTesla(strength.remanenceTesla()),
                words.milliTesla(strength.standardUncertaintyTesla()));
    Label large = Keys.words(br, "title");
    VBox story =
        new VBox(
            6,
            large,
            Keys.words(stockWords.where(piece)),
            stockWords.decisions(page.decisions()),
            sheets.readings(page));
    return page(
        head(words.say("stock.piece-title", code, stockWords.pieceState(piece)), true),
        keys,
        story);
  }

  private Node tray(StockPage.OneTray page) {
    Node keys =
        new FlowPane(
            8,
            8,
            Keys.key(
                words.say("stock.unsure"),
                () ->
                    question.line(
                        words.say("stock.unsure.question", page.tray()),
                        words.say("stock.why.hint"),
                        words.say("stock.unsure"),
                        words.say("never-mind"),
                        why -> model.unsure(page.tray(), why)),
                "small-key"),
            Keys.key(words.say("stock.moves"), () -> choose("stock.moves"), "small-key"));
    ScrollPane scroll = new ScrollPane(new TrayView(words, model::open).of(page.cells()));
    scroll.setFitToWidth(true);
    VBox.setVgrow(scroll, Priority.ALWAYS);
    return page(
        head(words.say("stock.tray-title", page.tray(), words.number(page.cells().size())), true),
        keys,
        scroll);
  }
}
