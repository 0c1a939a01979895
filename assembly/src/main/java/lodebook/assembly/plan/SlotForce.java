package lodebook.assembly.plan;

/// What the magnet in a slot feels, in that slot's own directions.
///
/// @param slot slot number, from 1
/// @param radialNewtons where it belongs, positive away from the ring's axis
/// @param tangentialNewtons where it belongs, positive to the next slot
/// @param axialNewtons positive towards the marked face. Magnets in line with one another have
///   none: for a magnet that goes in from the face it is the force when it stands proud by a
///   twentieth of its length
/// @param pushOutNewtons greatest force out of its pocket, on the way in and in place; for a
///   neighbour while the other goes in; negative where it is drawn in all the time
public record SlotForce(
    int slot,
    double radialNewtons,
    double tangentialNewtons,
    double axialNewtons,
    double pushOutNewtons) {}
