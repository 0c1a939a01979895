package lodebook.assembly.survey;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import lodebook.assembly.layout.ReadingPlace;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.RingField;

/// How readings of one design answer to its magnets, computed once per place and kept.
///
/// Rings of the same design can share one. Safe for use by several threads.
public final class ProbeResponses {
  private final RingDesign design;
  private final RingField field;
  private final Map<ReadingPlace, ReadingResponse> kept = new ConcurrentHashMap<>();

  /// @param design the layout with its magnet types
  public ProbeResponses(RingDesign design) {
    this.design = design;
    this.field = new RingField(design);
  }

  RingDesign design() {
    return design;
  }

  ReadingResponse at(ReadingPlace place) {
    return kept.computeIfAbsent(place, p -> new ReadingResponse(field, p));
  }
}
