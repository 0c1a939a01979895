package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;

/// Finds the readings that would settle what a survey leaves open.
final class ReadingFinder {
  private final RingModel ring;

  ReadingFinder(RingModel ring) {
    this.ring = ring;
  }

  private record Candidate(ProbePoint point, double separation) {}

  /// The points at which two explanations differ most, measured by the uncertainty of one reading;
  /// best first. Points near the magnets in question are tried, with the layout's spots and
  /// components before others.
  List<ProbePoint> parting(Explanation first, Explanation second, int count) {
    Explanation one = first.ofMagnets();
    Explanation other = second.ofMagnets();
    Set<Integer> slots = new LinkedHashSet<>();
    for (Explanation explanation : List.of(one, other)) {
      for (Fault fault : explanation.faults()) {
        if (fault.ofMagnet()) {
          for (int step = -1; step <= 1; step++) {
            slots.add(Math.floorMod(fault.place() + step, ring.slots()) + 1);
          }
        }
      }
    }
    List<Candidate> candidates = new ArrayList<>();
    for (int slot : slots) {
      for (Spot spot : Spot.values()) {
        for (Component component : Component.values()) {
          ProbePoint point = new ProbePoint(slot, spot, component);
          candidates.add(new Candidate(point, separation(point, one, other)));
        }
      }
    }
    candidates.sort(Comparator.comparingDouble(c -> -c.separation()));
    return candidates.stream().limit(count).map(Candidate::point).toList();
  }

  /// The point at which a slot's magnet shows best whether it is reversed: one of the layout's own.
  ProbePoint showing(int slot) {
    Probe probe = ring.layout().probe();
    Explanation reversed = Explanation.NONE.with(Fault.of(slot - 1, FaultKind.REVERSED));
    List<Candidate> candidates = new ArrayList<>();
    for (Spot spot : probe.spots()) {
      for (Component component : probe.components()) {
        ProbePoint point = new ProbePoint(slot, spot, component);
        candidates.add(new Candidate(point, separation(point, Explanation.NONE, reversed)));
      }
    }
    return candidates.stream()
        .max(Comparator.comparingDouble(Candidate::separation))
        .map(Candidate::point)
        .orElse(new ProbePoint(slot, Spot.CENTRE, Component.RADIAL));
  }

  private double separation(ProbePoint point, Explanation one, Explanation other) {
    Probe probe = ring.layout().probe();
    Row row =
        new Row(
            point,
            probe.radiusMetres(),
            probe.heightMetres(),
            0,
            0,
            true,
            new Meter("-", 0.01, 0),
            null);
    RowModel rows = new RowModel(ring, List.of(row));
    double first = rows.mean(one)[0];
    double second = rows.mean(other)[0];
    double variance = rows.covariance(one)[0][0] + rows.covariance(other)[0][0];
    return (first - second) * (first - second) / variance;
  }
}
