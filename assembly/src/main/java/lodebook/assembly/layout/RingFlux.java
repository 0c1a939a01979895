package lodebook.assembly.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import lodebook.assembly.field.Pose;
import lodebook.assembly.field.PosedBody;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.magnet.MagnetBody;

/// Flux density of a whole ring anywhere outside its magnets.
public final class RingFlux {
  private record Magnet(PosedBody body, Vector3 polarisation) {}

  private final List<Magnet> magnets = new ArrayList<>();

  /// @param design the ring; its bodies stand as the layout's rule wants them
  /// @param remanenceTesla remanence of each slot's magnet, slot 1 first; 0 for none
  /// @param facings the way each faces
  public RingFlux(RingDesign design, double[] remanenceTesla, List<Facing> facings) {
    Set<Integer> present = new TreeSet<>();
    for (int slot = 1; slot <= design.slots(); slot++) {
      if (remanenceTesla[slot - 1] > 0) {
        present.add(slot);
      }
    }
    RingPolarisation polarisation =
        MutualMagnetisation.of(design)
            .withOnly(present)
            .answerTo(RingPolarisation.of(remanenceTesla, facings));
    for (int slot : present) {
      double angle = design.layout().angleFromFirstRadians(slot);
      Vector3 centre = new Vector3(design.layout().slotRadiusMetres(), 0, 0).turnedAboutZ(angle);
      double turn = angle + design.bodyTurnRadians(slot, design.layout().ruleFacing(slot));
      magnets.add(
          new Magnet(
              new PosedBody(MagnetBody.of(design.typeAt(slot)), Pose.turnedAboutZ(centre, turn)),
              new Vector3(polarisation.out(slot), polarisation.next(slot), 0).turnedAboutZ(angle)));
    }
  }

  /// Flux density at a point, tesla.
  ///
  /// @param point metres, in the slot frame: x towards slot 1, z towards the marked face
  public Vector3 at(Vector3 point) {
    Vector3 sum = Vector3.ZERO;
    for (Magnet magnet : magnets) {
      sum = sum.plus(magnet.body().flux(point, magnet.polarisation()));
    }
    return sum;
  }
}
