package lodebook.ui.desk.room;

import org.jspecify.annotations.Nullable;

/// Leads from one room to another.
@FunctionalInterface
public interface Doors {
  /// Goes to a room.
  ///
  /// @param room its key, such as `bench`
  /// @param code the number to open there, or null
  void open(String room, @Nullable String code);
}
