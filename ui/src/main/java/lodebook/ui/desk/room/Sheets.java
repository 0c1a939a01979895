package lodebook.ui.desk.room;

import java.util.function.Consumer;
import java.util.function.Function;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableRow;
import javafx.scene.control.TableView;
import javafx.scene.input.KeyCode;

/// Long sheets with columns that sort; only the rows in sight are made.
public final class Sheets {
  private Sheets() {}

  /// A sheet whose rows open on Enter or a double touch.
  public static <T> TableView<T> sheet(String nothing, Consumer<T> opened) {
    TableView<T> sheet = new TableView<>();
    sheet.setColumnResizePolicy(TableView.CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN);
    sheet.setPlaceholder(Keys.words(nothing, "quiet"));
    sheet.setRowFactory(
        _ -> {
          TableRow<T> row = new TableRow<>();
          row.setOnMouseClicked(
              event -> {
                if (event.getClickCount() == 2 && !row.isEmpty()) {
                  opened.accept(row.getItem());
                }
              });
          return row;
        });
    sheet.setOnKeyPressed(
        event -> {
          T chosen = sheet.getSelectionModel().getSelectedItem();
          if (event.getCode() == KeyCode.ENTER && chosen != null) {
            opened.accept(chosen);
            event.consume();
          }
        });
    return sheet;
  }

  /// A column of words.
  public static <T> TableColumn<T, String> words(
      String title, double width, Function<T, String> text) {
    return column(title, width, text, s -> s, false);
  }

  /// A column of figures, which stand to the right and sort by size.
  public static <T> TableColumn<T, Double> figures(
      String title, double width, Function<T, Double> figure, Function<Double, String> text) {
    return column(title, width, figure, text, true);
  }

  private static <T, V> TableColumn<T, V> column(
      String title, double width, Function<T, V> value, Function<V, String> text, boolean right) {
    TableColumn<T, V> column = new TableColumn<>(title);
    column.setPrefWidth(width);
    if (right) {
      column.getStyleClass().add("figure");
    }
    column.setCellValueFactory(cell -> new ReadOnlyObjectWrapper<>(value.apply(cell.getValue())));
    column.setCellFactory(
        _ ->
            new TableCell<>() {
              @Override
              protected void updateItem(V item, boolean empty) {
                super.updateItem(item, empty);
                setText(empty || item == null ? null : text.apply(item));
                if (right && !getStyleClass().contains("figure")) {
                  getStyleClass().add("figure");
                }
              }
            });
    return column;
  }
}
