package lodebook.assembly.layout;

/// How readings change when a magnet or the probe moves, each per metre.
///
/// Magnets move along their slot's own out and to-next directions, their polarisation unturned. The
/// probe moves along out, to next or the axis at its own angle and keeps its direction.
///
/// @param magnetOut the magnet of each column moves out
/// @param magnetNext the magnet of each column moves to next
/// @param probeOut the probe moves away from the axis
/// @param probeNext the probe moves straight towards the next slot
/// @param probeUp the probe moves along the axis, towards the marked face
public record FieldDerivatives(
    FieldMatrix magnetOut,
    FieldMatrix magnetNext,
    FieldMatrix probeOut,
    FieldMatrix probeNext,
    FieldMatrix probeUp) {}
