package lodebook.ui.desk.stock;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.GridPane;
import lodebook.assembly.magnet.Strength;
import lodebook.db.stock.PieceState;
import lodebook.db.stock.Trays;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// A tray as it lies there: rows of letters, columns of numbers; cells of other names stand in
/// their order.
final class TrayView {
  private static final Pattern CELL = Pattern.compile("([A-Za-z])([0-9]{1,2})");
  private static final double WIDTH = 128;

  private final DeskWords words;
  private final Consumer<String> opened;

  TrayView(DeskWords words, Consumer<String> opened) {
    this.words = words;
    this.opened = opened;
  }

  private record At(int row, int column) {}

  private static @Nullable At at(String cell) {
    Matcher name = CELL.matcher(cell);
    if (!name.matches()) {
      return null;
    }
    int row = Character.toUpperCase(name.group(1).charAt(0)) - 'A';
    return new At(row, Integer.parseInt(name.group(2)));
  }

  Node of(List<Trays.Content> cells) {
    List<At> places = new ArrayList<>();
    int rows = 0;
    int columns = 0;
    for (Trays.Content content : cells) {
      At place = at(content.cell());
      if (place == null) {
        return inOrder(cells);
      }
      places.add(place);
      rows = Math.max(rows, place.row() + 1);
      columns = Math.max(columns, place.column());
    }
    GridPane grid = new GridPane(8, 8);
    grid.setAlignment(Pos.TOP_CENTER);
    for (int column = 1; column <= columns; column++) {
      Label head = Keys.words(words.number(column), "strong");
      head.setMaxWidth(Double.MAX_VALUE);
      head.setAlignment(Pos.CENTER);
      grid.add(head, column, 0);
    }
    for (int row = 0; row < rows; row++) {
      grid.add(Keys.words(Character.toString('A' + row), "strong"), 0, row + 1);
      for (int column = 1; column <= columns; column++) {
        grid.add(empty(), column, row + 1);
      }
    }
    for (int i = 0; i < cells.size(); i++) {
      grid.add(cell(cells.get(i)), places.get(i).column(), places.get(i).row() + 1);
    }
    return grid;
  }

  private Node inOrder(List<Trays.Content> cells) {
    FlowPane flow = new FlowPane(8, 8);
    flow.setAlignment(Pos.TOP_CENTER);
    cells.forEach(c -> flow.getChildren().add(cell(c)));
    return flow;
  }

  private static Node empty() {
    Label empty = new Label("");
    empty.getStyleClass().add("empty-cell");
    empty.setMinSize(WIDTH, 62);
    return empty;
  }

  private Button cell(Trays.Content content) {
    Strength strength = content.strength();
    String read =
        strength == null
            ? words.say("stock.unmeasured")
            : words.say("stock.millitesla", words.milliTesla(strength.remanenceTesla()));
    String state =
        content.state() == PieceState.USABLE
            ? ""
            : "\n" + words.say("piece." + content.state().word());
    Button cell =
        Keys.key(
            content.cell() + "   " + content.piece().number() + "\n" + read + state,
            () -> opened.accept(content.piece().toString()),
            "tray-cell");
    cell.setPrefWidth(WIDTH);
    cell.setMinHeight(62);
    return cell;
  }
}
