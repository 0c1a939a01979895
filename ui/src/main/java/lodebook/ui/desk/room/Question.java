package lodebook.ui.desk.room;

import java.util.List;
import java.util.function.Consumer;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;

/// A plain question laid over a room; Escape takes it away and nothing is done.
public final class Question {
  private static final double WIDTH = 560;

  private final StackPane over;

  /// @param over the room's ground
  public Question(StackPane over) {
    this.over = over;
  }

  /// One of the answers to choose from.
  ///
  /// @param text what stands on its key
  /// @param action what it does
  public record Choice(String text, Runnable action) {}

  /// Asks for one of some answers.
  public void choose(String question, List<Choice> choices, String never) {
    FlowPane keys = new FlowPane(10, 10);
    VBox sheet = sheet(question, keys);
    for (Choice choice : choices) {
      keys.getChildren()
          .add(
              Keys.key(
                  choice.text(),
                  () -> {
                    close(sheet);
                    choice.action().run();
                  }));
    }
    keys.getChildren().add(Keys.key(never, () -> close(sheet)));
    lay(sheet);
    keys.getChildren().getFirst().requestFocus();
  }

  /// Asks for a line of text.
  ///
  /// @param hint what stands in the empty field
  /// @param agree what stands on the key that takes it
  public void line(
      String question, String hint, String agree, String never, Consumer<String> taken) {
    TextField field = new TextField();
    field.setPromptText(hint);
    FlowPane keys = new FlowPane(10, 10);
    VBox sheet = sheet(question, field, keys);
    Runnable take =
        () -> {
          if (!field.getText().isBlank()) {
            close(sheet);
            taken.accept(field.getText().strip());
          }
        };
    field.setOnAction(_ -> take.run());
    Button yes = Keys.key(agree, take, "call");
    keys.getChildren().addAll(yes, Keys.key(never, () -> close(sheet)));
    lay(sheet);
    field.requestFocus();
  }

  private VBox sheet(String question, Region... parts) {
    VBox sheet = new VBox();
    sheet.getStyleClass().add("question");
    sheet.setMaxSize(WIDTH, Region.USE_PREF_SIZE);
    sheet.getChildren().add(Keys.words(question, "heading"));
    sheet.getChildren().addAll(parts);
    return sheet;
  }

  private void lay(VBox sheet) {
    StackPane veil = new StackPane(sheet);
    veil.getStyleClass().add("veil");
    StackPane.setAlignment(sheet, Pos.CENTER);
    veil.addEventHandler(
        KeyEvent.KEY_PRESSED,
        event -> {
          if (event.getCode() == KeyCode.ESCAPE) {
            close(sheet);
            event.consume();
          }
        });
    over.getChildren().add(veil);
  }

  private void close(VBox sheet) {
    over.getChildren().remove(sheet.getParent());
  }
}
