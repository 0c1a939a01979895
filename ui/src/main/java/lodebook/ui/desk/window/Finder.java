package lodebook.ui.desk.window;

import lodebook.db.builds.Rotor;
import lodebook.db.builds.Rotors;
import lodebook.db.trace.Trace;
import lodebook.db.trace.Traces;
import lodebook.ui.desk.station.Station;

/// Finds where a number is dealt with.
final class Finder {
  private final Station station;

  Finder(Station station) {
    this.station = station;
  }

  /// A place to go to.
  ///
  /// @param room the room's key
  /// @param code the number as the book writes it
  record Place(String room, String code) {}

  /// Where a number is dealt with; a number that the book does not know is refused.
  Place find(String typed) {
    return station.with(
        book -> {
          Trace thing = new Traces(book).trace(typed.strip());
          String room =
              switch (thing.kind()) {
                case "rotor" -> forRotor(new Rotors(book).show(thing.code()).rotor());
                case "lot", "piece", "tray" -> "stock";
                case "survey" -> "survey";
                default -> "trace";
              };
          return new Place(room, thing.code());
        });
  }

  private static String forRotor(Rotor rotor) {
    boolean open = rotor.state().equals("open") && rotor.unit() == null;
    if (!open) {
      return "trace";
    }
    return rotor.filled() < rotor.slots() ? "bench" : "survey";
  }
}
