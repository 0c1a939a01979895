package lodebook.ui.desk;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Random;
import java.util.stream.Stream;
import lodebook.db.book.BookAddress;
import lodebook.db.people.People;
import lodebook.ui.cli.Lodebook;
import lodebook.ui.desk.run.DefectLog;
import lodebook.ui.desk.run.InPlaceRunner;
import lodebook.ui.desk.run.Troubles;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.words.DeskWords;

/// A shop for trying the desktop: the invented workshop's book with one more lot and rotors that
/// wait at the bench.
public final class DeskShop {
  /// The commands that a shop is made with, made once and copied for each test.
  private static final Path MADE = make();

  private final Path folder;
  private final Time time = new Time();

  private DeskShop(Path folder) {
    this.folder = folder;
  }

  /// A clock that stands until it is moved.
  public static final class Time extends Clock {
    private Instant now = Instant.parse("2026-12-02T09:00:00Z");

    /// Time passes.
    public void pass(Duration duration) {
      now = now.plus(duration);
    }

    @Override
    public ZoneId getZone() {
      return ZoneOffset.UTC;
    }

    @Override
    public Clock withZone(ZoneId zone) {
      return this;
    }

    @Override
    public Instant instant() {
      return now;
    }
  }

  /// A shop of its own in a folder.
  public static DeskShop in(Path folder) {
    copy(MADE, folder);
    return new DeskShop(folder);
  }

  /// The shop's clock.
  public Time time() {
    return time;
  }

  /// Where its files are.
  public Path folder() {
    return folder;
  }

  /// Where its book is.
  public BookAddress address() {
    return new BookAddress.Folder(folder.resolve("book"));
  }

  /// A station at which somebody of the shop stands.
  public Station station(Locale language, String initials) {
    Station station =
        new Station(address(), "BENCH-1", time, new DeskWords(language, ZoneOffset.UTC));
    station.takenBy(
        station.with(
            book ->
                new People(book)
                    .list().stream()
                        .filter(p -> p.initials().equals(initials))
                        .findFirst()
                        .orElseThrow()));
    return station;
  }

  /// A runner that does everything at once.
  public InPlaceRunner runner(Station station) {
    return new InPlaceRunner(troubles(station));
  }

  /// What turns failures into words.
  public Troubles troubles(Station station) {
    return new Troubles(station.words(), log());
  }

  /// Where defects are written down.
  public DefectLog log() {
    return new DefectLog(folder.resolve("defects.log"), time);
  }

  /// Builds a planned rotor and takes a round of readings of it.
  ///
  /// @param reversed a slot whose magnet went in the wrong way round, or 0
  public void built(String rotor, int reversed) {
    lodebook.ui.desk.bench.BenchGauge.build(station(Locale.ENGLISH, "TB"), rotor);
    String rows =
        lodebook.ui.desk.bench.BenchGauge.round(station(Locale.ENGLISH, "TB"), rotor, reversed);
    does("survey", "import", rotor, file("round.csv", rows).toString(), "--meter", "GM-1");
    does("survey", "check", rotor);
  }

  /// Plans a ring of 48 slots, read in both components.
  public void ringOf48(String rotor) {
    String layout =
        """
        {
          "layout": "WIDE-48", "revision": "A", "polePairs": 12, "segmentsPerPolePair": 4,
          "focus": "out", "numbering": "clockwise", "firstSlotClockDegrees": 0,
          "firstFacingDegrees": 0, "slotRadiusMillimetres": 40.0, "magnetType": "BLK-4-4-10",
          "sideMagnetType": null, "workingRadiusMillimetres": 43.0,
          "probe": { "radiusMillimetres": 43.0, "heightMillimetres": 0.0,
                     "spots": ["centre"], "components": ["radial", "tangential"] },
          "spread": {}, "adhesive": "two-part epoxy", "bodyTurns": false
        }
        """;
    does("layout", "import", file("wide.json", layout).toString());
    does("layout", "release", "WIDE-48");
    does("plan", "--drop", "R-9", "R-10");
    does("rotor", "open", "WIDE-48", "--serial", rotor);
    does("plan", rotor, "--from", "L-2501", "--seconds", "1");
  }

  /// Writes a file.
  public Path file(String name, String text) {
    try {
      write(folder.resolve(name), text);
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
    return folder.resolve(name);
  }

  /// Runs a command on the shop's book; it must succeed.
  ///
  /// @return what it printed
  public String does(String... words) {
    return does(folder, time, words);
  }

  private static String does(Path folder, Clock clock, String... words) {
    Map<String, String> env = new HashMap<>();
    env.put("LODEBOOK_BOOK", folder.resolve("book").toString());
    env.put("LODEBOOK_BY", "MK");
    env.put("XDG_DATA_HOME", folder.toString());
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    int code =
        Lodebook.run(
            List.of(words),
            env,
            new PrintStream(out, true, StandardCharsets.UTF_8),
            new PrintStream(err, true, StandardCharsets.UTF_8),
            clock);
    if (code > 1) {
      throw new IllegalStateException(
          Arrays.toString(words)
              + " ended with "
              + code
              + ": "
              + err.toString(StandardCharsets.UTF_8));
    }
    return out.toString(StandardCharsets.UTF_8);
  }

  private static Path make() {
    try {
      Path folder = Files.createTempDirectory("desk-shop-");
      Clock clock = Clock.fixed(Instant.parse("2026-12-01T08:00:00Z"), ZoneOffset.UTC);
      does(
          folder,
          clock,
          "demo",
          "--into",
          Files.createDirectory(folder.resolve("demo")).toString());
      Files.move(folder.resolve("demo/book"), folder.resolve("book"));
      write(
          folder.resolve("lots.csv"),
          """
          lot,type,supplier,received,count,certificate,certificate_br_mT,location
          L-2501,BLK-4-4-10,Hollow Lane Magnetics (invented),2026-11-20,60,Z-881,1300,shelf 2
          L-2502,BLK-5-5-10,Hollow Lane Magnetics (invented),2026-11-27,200,Z-902,1300,shelf 3
          """);
      does(folder, clock, "lot", "import", folder.resolve("lots.csv").toString());
      write(folder.resolve("pieces.csv"), pieces(60));
      does(folder, clock, "piece", "import", "L-2501", folder.resolve("pieces.csv").toString());
      does(folder, clock, "lot", "accept", "L-2501", "--why", "readings agree");
      for (String rotor : List.of("R-9", "R-10", "R-11")) {
        does(folder, clock, "rotor", "open", "STIR-IN", "--serial", rotor);
      }
      does(folder, clock, "plan", "R-9", "R-10", "--from", "L-2501", "--seconds", "0.2");
      return folder;
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }

  private static String pieces(int count) {
    Random random = new Random(11);
    List<String> rows = new ArrayList<>();
    rows.add("piece,tray,cell,value,unit,standoff_mm,temperature_C,meter");
    for (int i = 1; i <= count; i++) {
      rows.add(
          String.format(
              Locale.ROOT,
              "%d,TR-%s,%s%d,%.1f,mT,1.5,20,GM-1",
              i,
              i <= 30 ? "C" : "D",
              (char) ('A' + (i - 1) % 30 / 6),
              (i - 1) % 6 + 1,
              261 * (1 + 0.012 * random.nextGaussian())));
    }
    return String.join("\n", rows) + "\n";
  }

  private static void write(Path file, String text) throws IOException {
    Files.writeString(file, text, StandardCharsets.UTF_8);
  }

  private static void copy(Path from, Path to) {
    try (Stream<Path> all = Files.walk(from)) {
      for (Path each : (Iterable<Path>) all::iterator) {
        Path target = to.resolve(from.relativize(each).toString());
        if (Files.isDirectory(each)) {
          Files.createDirectories(target);
        } else {
          Files.copy(each, target);
        }
      }
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }
}
