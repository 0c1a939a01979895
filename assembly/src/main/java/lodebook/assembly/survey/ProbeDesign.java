package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;

/// What the readings of a layout tell apart, and the fewest that tell enough.
///
/// Compared are the right ring, every single reversal, quarter turn and absence, and every pair of
/// reversals, with everything done as set by the person measuring. Two pairs are compared where
/// each magnet of the one lies within two slots of one of the other; farther apart they differ more
/// than either does from the right ring.
public final class ProbeDesign {
  private final RingModel ring;
  private final Meter meter;
  private final Comparisons comparisons;

  /// @param ring the ring as planned, every slot filled
  /// @param meter the meter that will be used
  public ProbeDesign(SurveyedRing ring, Meter meter) {
    this.ring = new RingModel(ring, new ProbeResponses(ring.design()));
    this.meter = meter;
    this.comparisons = new Comparisons(this.ring);
  }

  /// What the layout's own probe points tell.
  public ProbeReport ofLayout() {
    return of(layoutPoints());
  }

  private List<ProbePoint> layoutPoints() {
    Probe probe = ring.layout().probe();
    List<ProbePoint> points = new ArrayList<>();
    for (int slot = 1; slot <= ring.slots(); slot++) {
      for (Spot spot : probe.spots()) {
        for (Component component : probe.components()) {
          points.add(new ProbePoint(slot, spot, component));
        }
      }
    }
    return points;
  }

  /// What a set of readings tells.
  public ProbeReport of(List<ProbePoint> points) {
    return comparisons.report(points, among(points).at(points));
  }

  /// A set of readings with few points that tells every single fault apart at 1 in 1000 and every
  /// pair of reversals at 1 in 100, apart from what no reading over or between the slots could.
  ///
  /// Points are added for all pole pairs alike, those that settle most first; then whole kinds of
  /// points, then single ones are left out again as long as nothing is lost. The layout's own
  /// points are thinned out as well, if they tell enough. That finds a small set from which no
  /// reading can be left out, not always the smallest.
  public ProbeReport cheapest() {
    List<List<ProbePoint>> families = families();
    Separations.Of everywhere = among(joined(families));
    Comparisons possible = comparisons.without(everywhere.at(joined(families)));
    List<List<ProbePoint>> chosen = new ArrayList<>();
    List<List<ProbePoint>> left = new ArrayList<>(families);
    double lack = Double.POSITIVE_INFINITY;
    while (lack > 0 && !left.isEmpty()) {
      List<ProbePoint> best = left.getFirst();
      double least = Double.POSITIVE_INFINITY;
      for (List<ProbePoint> family : left) {
        double then = possible.lack(everywhere.at(joined(with(chosen, family))));
        if (then < least) {
          least = then;
          best = family;
        }
      }
      chosen.add(best);
      left.remove(best);
      lack = least;
    }
    for (List<ProbePoint> family : List.copyOf(chosen)) {
      List<List<ProbePoint>> fewer = new ArrayList<>(chosen);
      fewer.remove(family);
      if (!fewer.isEmpty() && possible.allTold(everywhere.at(joined(fewer)))) {
        chosen = fewer;
      }
    }
    List<ProbePoint> fewest = pruned(joined(chosen), possible, everywhere);
    if (possible.allTold(everywhere.at(layoutPoints()))) {
      List<ProbePoint> ofLayout = pruned(layoutPoints(), possible, everywhere);
      fewest = ofLayout.size() <= fewest.size() ? ofLayout : fewest;
    }
    return comparisons.report(fewest, everywhere.at(fewest));
  }

  private static List<ProbePoint> pruned(
      List<ProbePoint> points, Comparisons possible, Separations.Of everywhere) {
    List<ProbePoint> kept = points;
    for (ProbePoint point : points) {
      List<ProbePoint> fewer = new ArrayList<>(kept);
      fewer.remove(point);
      if (!fewer.isEmpty() && possible.allTold(everywhere.at(fewer))) {
        kept = fewer;
      }
    }
    return kept;
  }

  /// Points of the same kind over the same slot of every pole pair.
  private List<List<ProbePoint>> families() {
    Layout layout = ring.layout();
    List<List<ProbePoint>> families = new ArrayList<>();
    for (Spot spot : Spot.values()) {
      for (Component component : Component.values()) {
        for (int first = 1; first <= layout.segmentsPerPolePair(); first++) {
          List<ProbePoint> family = new ArrayList<>();
          for (int slot = first; slot <= ring.slots(); slot += layout.segmentsPerPolePair()) {
            family.add(new ProbePoint(slot, spot, component));
          }
          families.add(family);
        }
      }
    }
    return families;
  }

  private static List<List<ProbePoint>> with(List<List<ProbePoint>> some, List<ProbePoint> more) {
    List<List<ProbePoint>> all = new ArrayList<>(some);
    all.add(more);
    return all;
  }

  private static List<ProbePoint> joined(List<List<ProbePoint>> families) {
    return families.stream().flatMap(List::stream).toList();
  }

  private Separations.Of among(List<ProbePoint> points) {
    Probe probe = ring.layout().probe();
    List<Row> rows =
        points.stream()
            .map(
                point ->
                    new Row(
                        point, probe.radiusMetres(), probe.heightMetres(), 0, 0, true, meter, null))
            .toList();
    return new Separations.Of(points, new RowModel(ring, rows), comparisons.faults());
  }
}
