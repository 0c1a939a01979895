package lodebook.assembly.field;

/// A uniformly polarised magnet standing somewhere.
///
/// @param place its body and where it stands
/// @param polarisation tesla, in the frame in which it stands
public record PosedMagnet(PosedBody place, Vector3 polarisation) {

  /// Flux density at a point, tesla.
  public Vector3 flux(Vector3 point) {
    return place.flux(point, polarisation);
  }
}
