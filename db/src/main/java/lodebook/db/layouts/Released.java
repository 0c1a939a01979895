package lodebook.db.layouts;

import java.time.Instant;

/// That a revision was released.
///
/// @param by initials of who released it
/// @param at the time stated
public record Released(String by, Instant at) {}
