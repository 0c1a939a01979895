package lodebook.assembly.survey;

import java.util.List;
import lodebook.assembly.layout.Facing;
import org.jspecify.annotations.Nullable;

/// One thing that is wrong in a ring, or one reading that belongs to nothing.
///
/// @param slot slot number; for a suspect reading the slot as written
/// @param kind what is wrong
/// @param shouldFace facing by the layout
/// @param faces facing that the readings show, or null where there is no magnet or only a reading
///   is suspect
/// @param byDegrees angle by which the magnet is turned (kind turned), or null
/// @param strengthShare best-fit strength as a share of the piece's own (kinds weak, strong,
///   missing), or null
/// @param probability probability of this finding among all explanations with the same measuring
/// @param readings the readings of this slot
/// @param alsoPossibleSlots slots in which the fault would be under the measuring alternatives
public record Finding(
    int slot,
    FaultKind kind,
    Facing shouldFace,
    @Nullable Facing faces,
    @Nullable Double byDegrees,
    @Nullable Double strengthShare,
    double probability,
    List<Evidence> readings,
    List<Integer> alsoPossibleSlots) {
  public Finding {
    readings = List.copyOf(readings);
    alsoPossibleSlots = List.copyOf(alsoPossibleSlots);
  }
}
