package lodebook.ui.desk.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.MutualMagnetisation;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.ReadingPlace;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.RingField;
import lodebook.assembly.layout.RingPolarisation;
import lodebook.db.builds.PlaceHow;
import lodebook.db.builds.PlaceRow;
import lodebook.db.builds.Placements;
import lodebook.db.builds.PlannedSlot;
import lodebook.db.builds.Plans;
import lodebook.db.builds.Rotors;
import lodebook.ui.desk.station.Station;

/// A gauge without errors: what it shows at the step where a rotor stands is computed from the
/// magnets' field, some of them the wrong way round.
public final class BenchGauge {
  private final Station station;

  /// @param station where it lies
  public BenchGauge(Station station) {
    this.station = station;
  }

  private BenchStep step(String rotor) {
    if (new StepLoader(station).load(rotor, true) instanceof BenchLoad.Ready(BenchStep step)) {
      return step;
    }
    throw new IllegalStateException(rotor + " has no step");
  }

  /// The slot of the step at which a rotor stands.
  public int slot(String rotor) {
    return step(rotor).slot();
  }

  /// The next reading of a rotor, in mT.
  ///
  /// @param reversed slots whose magnets stand the wrong way round
  public String reads(String rotor, int... reversed) {
    BenchStep step = step(rotor);
    return String.format(
        Locale.ROOT, "%.1f", 1e3 * tesla(step, step.toRead().getFirst(), reversed));
  }

  /// What a point of a step's ring reads, tesla.
  static double tesla(BenchStep step, ProbePoint point, int... reversed) {
    RingDesign design = step.design();
    double[] remanences = new double[design.slots()];
    List<Facing> facings = new ArrayList<>(design.ruleFacings());
    step.standing().forEach((slot, m) -> remanences[slot - 1] = m.strength().remanenceTesla());
    for (int slot : reversed) {
      facings.set(slot - 1, facings.get(slot - 1).reversed());
    }
    RingPolarisation polarisation =
        MutualMagnetisation.of(design)
            .withOnly(step.standing().keySet())
            .answerTo(RingPolarisation.of(remanences, facings));
    return new RingField(design)
        .at(List.of(ReadingPlace.of(design.layout(), point)))
        .apply(polarisation)[0];
  }

  /// Puts all planned magnets of a rotor in.
  public static void build(Station station, String rotor) {
    station.change(
        book -> {
          List<PlaceRow> rows = new ArrayList<>();
          for (PlannedSlot slot : new Plans(book).show(rotor).slots()) {
            rows.add(new PlaceRow(slot.slot(), slot.magnet(), slot.facing().degrees()));
          }
          new Placements(book).place(station.act(), rotor, rows, PlaceHow.PLAIN);
        });
  }

  /// A file of a whole round, one magnet perhaps the wrong way round.
  ///
  /// @param reversed the slot of that magnet, or 0
  public static String round(Station station, String rotor, int reversed) {
    RingDesign design = station.with(book -> new Rotors(book).show(rotor).design());
    double[] remanences = new double[design.slots()];
    station
        .with(book -> new Plans(book).stockFor(List.of(rotor), List.of()).rings().getFirst())
        .kept()
        .forEach(k -> remanences[k.slot() - 1] = k.strength().remanenceTesla());
    List<Facing> facings = new ArrayList<>(design.ruleFacings());
    if (reversed > 0) {
      facings.set(reversed - 1, facings.get(reversed - 1).reversed());
    }
    RingPolarisation polarisation =
        MutualMagnetisation.of(design).answerTo(RingPolarisation.of(remanences, facings));
    StringBuilder rows = new StringBuilder("slot,spot,component,value,unit\n");
    for (int slot = 1; slot <= design.slots(); slot++) {
      for (ProbePoint point : StepLoader.points(design.layout(), slot)) {
        double tesla =
            new RingField(design)
                .at(List.of(ReadingPlace.of(design.layout(), point)))
                .apply(polarisation)[0];
        rows.append(
            String.format(
                Locale.ROOT,
                "%d,centre,%s,%.1f,mT%n",
                slot,
                point.component().name().toLowerCase(Locale.ROOT),
                tesla * 1e3));
      }
    }
    return rows.toString();
  }
}
