package lodebook.ui.desk.history;

import java.util.function.Function;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import lodebook.db.history.HistoryEntry;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.room.Room;
import lodebook.ui.desk.room.Slip;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// The history as a long sheet, the latest line on top.
public final class HistoryRoom implements Room {
  private final HistoryModel model;
  private final TextField number = new TextField();
  private final VBox node;

  /// @param model the lines
  /// @param words the desktop's language
  public HistoryRoom(HistoryModel model, DeskWords words) {
    this.model = model;
    number.setPromptText(words.say("history.number"));
    number.setId("history-number");
    number.textProperty().bindBidirectional(model.number());
    number.setOnAction(_ -> model.look());
    TextField person = new TextField();
    person.setPromptText(words.say("history.person"));
    person.textProperty().bindBidirectional(model.person());
    person.setPrefColumnCount(8);
    Button verify = Keys.key(words.say("history.verify"), model::verify, "small-key");
    verify.setId("verify");
    HBox line =
        new HBox(
            10,
            number,
            Keys.key(words.say("history.show"), model::look, "call", "small-key"),
            person,
            verify);
    line.setAlignment(Pos.CENTER_LEFT);
    TableView<HistoryEntry> sheet = new TableView<>(model.lines());
    sheet.setColumnResizePolicy(TableView.CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN);
    sheet.getColumns().add(column(words.say("history.line"), 70, l -> Long.toString(l.sequence())));
    sheet.getColumns().add(column(words.say("history.when"), 150, model::when));
    sheet.getColumns().add(column(words.say("history.who"), 60, HistoryEntry::initials));
    sheet.getColumns().add(column(words.say("history.station"), 100, HistoryEntry::station));
    sheet.getColumns().add(column(words.say("history.what"), 150, HistoryEntry::operation));
    sheet.getColumns().add(column(words.say("history.with"), 600, model::with));
    sheet.setPlaceholder(Keys.words(words.say("history.none"), "quiet"));
    VBox.setVgrow(sheet, Priority.ALWAYS);
    node = new VBox(12, line, new Slip(model.said()), sheet);
    node.setPadding(new Insets(18, 18, 12, 18));
  }

  private static TableColumn<HistoryEntry, String> column(
      String title, double width, Function<HistoryEntry, String> text) {
    TableColumn<HistoryEntry, String> column = new TableColumn<>(title);
    column.setPrefWidth(width);
    column.setCellValueFactory(cell -> new ReadOnlyStringWrapper(text.apply(cell.getValue())));
    return column;
  }

  @Override
  public String key() {
    return "history";
  }

  @Override
  public Node node() {
    return node;
  }

  @Override
  public void enter(@Nullable String code) {
    if (code != null) {
      number.setText(code);
    }
    model.look();
  }

  @Override
  public void refresh() {
    model.look();
  }
}
