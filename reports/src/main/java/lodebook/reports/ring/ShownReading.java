package lodebook.reports.ring;

import lodebook.assembly.layout.ProbePoint;
import org.jspecify.annotations.Nullable;

/// One probe point of the band of readings round a ring.
///
/// @param point where and which component
/// @param expectedTesla expected value
/// @param bandTesla half width of the expected band
/// @param readTesla the value read, or null where it has not been read
public record ShownReading(
    ProbePoint point, double expectedTesla, double bandTesla, @Nullable Double readTesla) {
  /// Whether the value read lies outside the expected band.
  public boolean outside() {
    return readTesla != null && Math.abs(readTesla - expectedTesla) > bandTesla;
  }
}
