package lodebook.assembly.field;

/// A body standing somewhere.
///
/// @param body the body in its own frame
/// @param pose where it stands
public record PosedBody(Body body, Pose pose) {

  /// Flux density, tesla, at a point (metres), for a polarisation (tesla), all in the frame in
  /// which the pose is given.
  public Vector3 flux(Vector3 point, Vector3 polarisation) {
    return pose.directionOutOf(body.flux(pose.pointInto(point), pose.directionInto(polarisation)));
  }

  /// Whether a point lies inside the body.
  public boolean contains(Vector3 point) {
    Vector3 own = pose.pointInto(point);
    return body.contains(own.x(), own.y(), own.z());
  }
}
