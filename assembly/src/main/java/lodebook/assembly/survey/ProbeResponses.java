package lodebook.assembly.survey;

import java.util.Map;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import lodebook.assembly.layout.MutualMagnetisation;
import lodebook.assembly.layout.ReadingPlace;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.RingField;

/// How readings of one design answer to the remanence of its magnets, computed once per place and
/// filled slots and kept.
///
/// Rings of the same design can share one. Safe for use by several threads.
public final class ProbeResponses {
  private final RingDesign design;
  private final RingField field;
  private final MutualMagnetisation whole;
  private final Map<Set<Integer>, Filled> filled = new ConcurrentHashMap<>();

  /// @param design the layout with its magnet types
  public ProbeResponses(RingDesign design) {
    this.design = design;
    this.field = new RingField(design);
    this.whole = MutualMagnetisation.of(design);
  }

  RingDesign design() {
    return design;
  }

  /// Responses of a ring with magnets in some slots.
  ///
  /// @param slots slot numbers, from 1
  Filled withOnly(Set<Integer> slots) {
    return filled.computeIfAbsent(
        Set.copyOf(slots),
        set -> new Filled(field, set.size() == design.slots() ? whole : whole.withOnly(set)));
  }

  /// Responses of one state of filling.
  static final class Filled {
    private final RingField field;
    private final MutualMagnetisation mutual;
    private final Map<ReadingPlace, ReadingResponse> kept = new ConcurrentHashMap<>();

    private Filled(RingField field, MutualMagnetisation mutual) {
      this.field = field;
      this.mutual = mutual;
    }

    ReadingResponse at(ReadingPlace place) {
      return kept.computeIfAbsent(place, p -> new ReadingResponse(field, mutual, p));
    }
  }
}
