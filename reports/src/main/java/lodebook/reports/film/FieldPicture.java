package lodebook.reports.film;

import java.util.List;
import java.util.Locale;
import lodebook.reports.ring.ShownReading;

/// Radial flux density round a ring.
///
/// @param title the layout's or rotor's name
/// @param slots number of slots
/// @param curveTesla expected radial flux density at evenly spaced places, the first over slot 1,
///   rising slot numbers; not to be changed
/// @param readings expected values with their bands, and what was read, radial only
/// @param language the language of the words
@SuppressWarnings("ArrayRecordComponent")
public record FieldPicture(
    String title, int slots, double[] curveTesla, List<ShownReading> readings, Locale language) {
  public FieldPicture {
    readings = List.copyOf(readings);
  }
}
