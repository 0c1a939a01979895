package lodebook.db.rights;

/// A person who works with the book.
///
/// @param id the book's own number, never shown
/// @param initials how the person signs, as first written
/// @param name full name
/// @param role what the person may do
/// @param retired whether the person no longer signs
public record Person(long id, String initials, String name, Role role, boolean retired) {}
