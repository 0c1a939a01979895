package lodebook.ui.desk.stock;

import java.util.List;
import java.util.function.Consumer;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TableView;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import lodebook.assembly.magnet.Strength;
import lodebook.db.stock.Piece;
import lodebook.db.stock.PieceReading;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.room.Sheets;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// The pieces of a lot on a sheet, and the readings of one piece.
final class PieceSheets {
  private final DeskWords words;
  private final StockWords said;
  private final Consumer<String> opened;

  /// @param opened takes the name of a piece that is to be looked at
  PieceSheets(DeskWords words, Consumer<String> opened) {
    this.words = words;
    this.said = new StockWords(words);
    this.opened = opened;
  }

  TableView<Piece> of(List<Piece> all) {
    TableView<Piece> sheet =
        Sheets.sheet(words.say("stock.no-piece"), p -> opened.accept(p.name().toString()));
    sheet.getColumns().add(Sheets.words(words.say("stock.piece"), 120, p -> p.name().toString()));
    sheet.getColumns().add(Sheets.words(words.say("stock.state"), 110, said::pieceState));
    sheet
        .getColumns()
        .add(
            Sheets.figures(
                words.say("stock.br"),
                110,
                p -> tesla(p.strength()),
                t -> Double.isNaN(t) ? "" : words.milliTesla(t)));
    sheet
        .getColumns()
        .add(
            Sheets.figures(
                words.say("stock.doubt"),
                80,
                p -> doubt(p.strength()),
                t -> Double.isNaN(t) ? "" : words.milliTesla(t)));
    sheet.getColumns().add(Sheets.words(words.say("stock.where"), 260, said::where));
    sheet.getItems().setAll(all);
    sheet.setMinHeight(120);
    return sheet;
  }

  private static double tesla(@Nullable Strength strength) {
    return strength == null ? Double.NaN : strength.remanenceTesla();
  }

  private static double doubt(@Nullable Strength strength) {
    return strength == null ? Double.NaN : strength.standardUncertaintyTesla();
  }

  Node readings(StockPage.OnePiece page) {
    VBox rows = new VBox();
    rows.getStyleClass().add("rows");
    for (PieceReading reading : page.readings()) {
      String meter = reading.meter();
      Label row =
          Keys.words(
              words.say(
                  reading.doubted() ? "stock.reading.doubted" : "stock.reading",
                  words.milliTesla(reading.fluxTesla()),
                  words.number(reading.standoffMetres() * 1e3, 2),
                  meter == null ? words.say("stock.no-meter") : meter,
                  reading.by(),
                  words.minute(reading.statedAt())));
      HBox line = new HBox(row);
      line.getStyleClass().add("row");
      rows.getChildren().add(line);
    }
    return rows;
  }
}
