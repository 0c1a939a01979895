package lodebook.reports.traveller;

import java.util.List;
import lodebook.assembly.layout.Facing;
import org.jspecify.annotations.Nullable;

/// One magnet to put in.
///
/// @param slot its slot
/// @param lot the lot it comes from
/// @param piece the piece, such as "L-2404/0017", or null for any magnet of the lot
/// @param tray the tray it lies in, or null where it lies in none
/// @param cell its cell in the tray, or null
/// @param facing the way its north points
/// @param remark what to watch for, in the sheet's language, or null
/// @param expected readings to take after it is in; empty for none
/// @param inPlace whether it is in already
public record Step(
    int slot,
    String lot,
    @Nullable String piece,
    @Nullable String tray,
    @Nullable String cell,
    Facing facing,
    @Nullable String remark,
    List<ExpectedReading> expected,
    boolean inPlace) {
  public Step {
    expected = List.copyOf(expected);
  }
}
