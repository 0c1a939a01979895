package lodebook.assembly.layout;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.field.Load;
import lodebook.assembly.field.PosedMagnet;
import lodebook.assembly.field.Vector3;

/// Force and torque on one magnet of a ring from the others that are already in it.
public final class RingLoad {
  private final RingDesign design;
  private final List<PosedMagnet> magnets = new ArrayList<>();

  /// A ring, full or in the making.
  ///
  /// @param design the ring
  /// @param polarisation its magnets' polarisations; a slot with none is empty
  public RingLoad(RingDesign design, RingPolarisation polarisation) {
    this.design = design;
    for (int slot = 1; slot <= design.slots(); slot++) {
      Vector3 inSlot = new Vector3(polarisation.out(slot), polarisation.next(slot), 0);
      magnets.add(
          new PosedMagnet(
              design.bodyAt(slot),
              inSlot.turnedAboutZ(design.layout().angleFromFirstRadians(slot))));
    }
  }

  /// Force (newtons) and torque about the magnet's middle (newton metres) on the magnet of a slot,
  /// in the slot's frame: x out, y to next, z towards the marked face.
  public Load on(int slot) {
    List<PosedMagnet> others = new ArrayList<>();
    for (int other = 1; other <= design.slots(); other++) {
      PosedMagnet magnet = magnets.get(other - 1);
      if (other != slot && magnet.polarisation().norm() > 0) {
        others.add(magnet);
      }
    }
    Load load = Load.on(magnets.get(slot - 1), others);
    double back = -design.layout().angleFromFirstRadians(slot);
    return new Load(load.force().turnedAboutZ(back), load.torque().turnedAboutZ(back));
  }
}
