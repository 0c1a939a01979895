package lodebook.ui.desk.room;

import java.util.Locale;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Pos;
import javafx.scene.AccessibleRole;
import javafx.scene.layout.VBox;

/// A slip on which something is said; it is not there while nothing is.
public final class Slip extends VBox {
  /// @param said what is said
  public Slip(ObservableValue<Said> said) {
    setAccessibleRole(AccessibleRole.TEXT);
    setAlignment(Pos.CENTER_LEFT);
    said.addListener((_, _, now) -> show(now));
    show(said.getValue());
  }

  private void show(Said said) {
    getStyleClass().setAll("said", said.tone().name().toLowerCase(Locale.ROOT));
    getChildren().clear();
    if (!said.silent()) {
      getChildren().add(Keys.words(said.sentence(), "first"));
      said.rows().forEach(row -> getChildren().add(Keys.words(row)));
    }
    setAccessibleText(said.sentence() + " " + String.join(" ", said.rows()));
    setVisible(!said.silent());
    setManaged(!said.silent());
  }
}
