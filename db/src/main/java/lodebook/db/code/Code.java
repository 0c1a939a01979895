package lodebook.db.code;

/// A number of the shop that the book holds.
///
/// @param id the book's own number of the thing, never shown
/// @param shown the number as first written
/// @param kind what it names
public record Code(long id, String shown, CodeKind kind) {}
