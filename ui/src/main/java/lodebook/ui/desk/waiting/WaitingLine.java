package lodebook.ui.desk.waiting;

import java.util.List;

/// Something that waits, with the things it concerns.
///
/// @param key its sentence's key, without `waiting.`
/// @param things what waits
public record WaitingLine(String key, List<Thing> things) {
  public WaitingLine {
    things = List.copyOf(things);
  }

  /// A thing that waits.
  ///
  /// @param text how it is named
  /// @param room where it is dealt with
  /// @param code the number to open there
  public record Thing(String text, String room, String code) {}
}
