package lodebook.ui.desk.room;

import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Region;

/// The keys and words of all rooms, made in one way.
public final class Keys {
  private Keys() {}

  /// A key that does something when it is touched, or on Enter or the space bar.
  public static Button key(String text, Runnable action, String... styles) {
    Button key = new Button(text);
    key.getStyleClass().setAll("key");
    key.getStyleClass().addAll(styles);
    key.setOnAction(_ -> action.run());
    key.addEventHandler(
        KeyEvent.KEY_PRESSED,
        event -> {
          if (event.getCode() == KeyCode.ENTER) {
            key.fire();
            event.consume();
          }
        });
    key.setMinWidth(Region.USE_PREF_SIZE);
    return key;
  }

  /// Words that lead somewhere.
  public static Button link(String text, Runnable action) {
    Button link = key(text, action);
    link.getStyleClass().setAll("link");
    return link;
  }

  /// Words that wrap.
  public static Label words(String text, String... styles) {
    Label label = new Label(text);
    label.setWrapText(true);
    label.getStyleClass().addAll(styles);
    return label;
  }
}
