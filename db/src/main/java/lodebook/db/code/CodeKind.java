package lodebook.db.code;

import java.util.Locale;

/// What a number of the shop can name.
public enum CodeKind {
  /// Magnets received together.
  LOT,
  /// The design of a ring.
  LAYOUT,
  /// The design of a gear.
  GEAR,
  /// An order to build gears.
  BATCH,
  /// A physical ring.
  ROTOR,
  /// A physical gear.
  UNIT,
  /// A lot or a single piece of something that is no magnet.
  PART,
  /// A tray of measured pieces.
  TRAY,
  /// Units that went to a customer.
  SHIPMENT,
  /// An instrument.
  METER,
  /// A set of readings round a rotor; its number is given by the book.
  SURVEY,
  /// Something out of requirement; its number is given by the book.
  NONCONFORMANCE;

  /// The word in the table, in JSON and on screens, such as `lot`.
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /// The kind of a word as [#word()] gives it.
  public static CodeKind of(String word) {
    return valueOf(word.toUpperCase(Locale.ROOT));
  }
}
