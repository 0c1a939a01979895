package lodebook.assembly.survey;

import java.util.Set;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.ReadingPlace;
import org.jspecify.annotations.Nullable;

/// A ring as built, ready to be compared with readings: polarisation of every slot by the layout's
/// rule and the response of the field, kept per location.
final class RingModel {
  private final SurveyedRing ring;
  private final ProbeResponses whole;
  private final ProbeResponses.Filled responses;
  private final double[] polarisation;

  RingModel(SurveyedRing ring, ProbeResponses responses) {
    this.ring = ring;
    this.whole = responses;
    this.responses = responses.withOnly(ring.magnets().keySet());
    this.polarisation = new double[2 * ring.layout().slots()];
    for (int slot = 1; slot <= slots(); slot++) {
      PlacedMagnet magnet = ring.at(slot);
      if (magnet != null) {
        double facing = ring.layout().ruleFacing(slot).radians();
        double tesla = magnet.strength().remanenceTesla();
        polarisation[2 * slot - 2] = tesla * Math.cos(facing);
        polarisation[2 * slot - 1] = tesla * Math.sin(facing);
      }
    }
  }

  Layout layout() {
    return ring.layout();
  }

  SurveyedRing ring() {
    return ring;
  }

  int slots() {
    return ring.layout().slots();
  }

  /// Magnet of a slot index from 0, or null.
  @Nullable PlacedMagnet magnet(int index) {
    return ring.at(index + 1);
  }

  boolean empty() {
    return ring.magnets().isEmpty();
  }

  boolean filled(int index) {
    return magnet(index) != null;
  }

  /// Polarisation of the right ring at 20 °C: outwards and towards next for each slot, tesla.
  double[] rightPolarisation() {
    return polarisation.clone();
  }

  double[] polarisation(Explanation explanation) {
    double[] p = polarisation.clone();
    for (Fault fault : explanation.faults()) {
      if (fault.ofMagnet()) {
        int at = 2 * fault.place();
        fault.polarise(p[at], p[at + 1], p, at);
      }
    }
    return p;
  }

  /// Response of a reading.
  ///
  /// @param filled slots, from 1, that held a magnet then, or null for all of the ring's
  ReadingResponse responseAt(ReadingPlace place, @Nullable Set<Integer> filled) {
    return filled == null ? responses.at(place) : whole.withOnly(filled).at(place);
  }

  /// Whether every magnet that an explanation names is there.
  boolean holds(Explanation explanation) {
    return explanation.faults().stream().allMatch(f -> !f.ofMagnet() || filled(f.place()));
  }

  /// Response of a reading of the ring with all its magnets, two numbers per slot.
  double[] fluxAt(ReadingPlace place) {
    return responses.at(place).flux();
  }
}
