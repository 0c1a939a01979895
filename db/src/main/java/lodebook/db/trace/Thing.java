package lodebook.db.trace;

import java.time.Instant;
import org.jspecify.annotations.Nullable;

/// A thing to be traced.
///
/// @param id the book's own number; of a piece its own, else that of its code
/// @param code as people see it
/// @param kind in a word
/// @param at when it was recorded, or null
/// @param state in a word, or empty
record Thing(long id, String code, String kind, @Nullable Instant at, String state) {}
