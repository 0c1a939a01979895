package lodebook.ui.desk.room;

import javafx.scene.Node;
import org.jspecify.annotations.Nullable;

/// A room of the desktop.
public interface Room {
  /// Its name's key, without `room.`, such as `bench`.
  String key();

  /// What it shows.
  Node node();

  /// Somebody comes in.
  ///
  /// @param code the number they come for, or null for none in particular
  void enter(@Nullable String code);

  /// The book was changed, here or elsewhere: show it as it is now, without disturbing who types.
  void refresh();

  /// Whether leaving would lose something that was typed and not confirmed.
  default boolean unfinished() {
    return false;
  }
}
