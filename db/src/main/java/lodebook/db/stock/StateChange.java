package lodebook.db.stock;

import java.time.Instant;

/// A decision about a lot or a piece.
///
/// @param state the state from then on, as in the tables
/// @param why the reason given
/// @param by initials of who decided
/// @param statedAt when, as the person says
/// @param recordedAt when it was recorded
public record StateChange(
    String state, String why, String by, Instant statedAt, Instant recordedAt) {}
