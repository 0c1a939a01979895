package lodebook.ui.desk.trace;

import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import lodebook.assembly.layout.RingDesign;
import lodebook.db.builds.RotorShown;
import lodebook.db.builds.Rotors;
import lodebook.db.layouts.Layouts;
import lodebook.db.trace.Trace;
import lodebook.db.trace.Traces;
import lodebook.reports.ring.RingPicture;
import lodebook.ui.desk.room.Said;
import lodebook.ui.desk.run.Runner;
import lodebook.ui.desk.station.Station;
import lodebook.ui.paper.RingPictures;
import org.jspecify.annotations.Nullable;

/// Where a number came from and where it went.
public final class TraceModel {
  private final Station station;
  private final Runner runner;
  private final ReadOnlyObjectWrapper<@Nullable Traced> traced = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<Said> said = new ReadOnlyObjectWrapper<>(Said.NOTHING);

  /// What is shown of a number.
  ///
  /// @param trace both trees
  /// @param ring its ring, where it has one
  public record Traced(Trace trace, @Nullable RingPicture ring) {}

  /// @param station whose book it is
  /// @param runner does what takes time
  public TraceModel(Station station, Runner runner) {
    this.station = station;
    this.runner = runner;
    said.set(Said.of(Said.Tone.PLAIN, station.words().say("trace.hint")));
  }

  /// What is traced, or null before the first.
  public ReadOnlyObjectProperty<@Nullable Traced> traced() {
    return traced.getReadOnlyProperty();
  }

  /// What is said.
  public ReadOnlyObjectProperty<Said> said() {
    return said.getReadOnlyProperty();
  }

  /// Traces a number.
  public void trace(String code) {
    runner.run(
        station.words().say("doing.trace"),
        () -> read(code.strip()),
        found -> {
          said.set(Said.NOTHING);
          traced.set(found);
        },
        trouble -> said.set(Said.of(trouble)));
  }

  /// Traces the same number once more.
  public void again() {
    Traced now = traced.get();
    if (now != null) {
      trace(now.trace().code());
    }
  }

  private Traced read(String code) {
    return station.with(
        book -> {
          Trace trace = new Traces(book).trace(code);
          RingPicture ring = null;
          if (trace.kind().equals("rotor")) {
            RotorShown rotor = new Rotors(book).show(trace.code());
            ring = RingPictures.of(rotor, station.words().locale());
          } else if (trace.kind().equals("layout")) {
            RingDesign design = new Layouts(book).design(trace.code());
            ring = RingPictures.of(design, station.words().locale());
          }
          return new Traced(trace, ring);
        });
  }
}
