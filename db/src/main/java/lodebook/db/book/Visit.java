package lodebook.db.book;

import java.time.Duration;
import java.time.InstantSource;

/// Who opens a book, from where and what for.
///
/// @param station name of the computer
/// @param doing what others are told who must wait, such as `piece import`
/// @param clock the one clock; times are cut to microseconds
/// @param patience how long to wait for the turn
public record Visit(String station, String doing, InstantSource clock, Duration patience) {
  /// A visit that waits 10 s for its turn.
  public Visit(String station, String doing, InstantSource clock) {
    this(station, doing, clock, Duration.ofSeconds(10));
  }
}
