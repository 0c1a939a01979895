package lodebook.ui.process;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.api.parallel.Execution;
import org.junit.jupiter.api.parallel.ExecutionMode;

/// Several processes at one embedded book at once: they take turns, one wins what only one can
/// have, and nothing is lost.
@Execution(ExecutionMode.CONCURRENT)
class RaceTest {
  private static final int RACERS = 8;

  @TempDir static Path prepared = Path.of(".");
  @TempDir Path folder;

  @SuppressWarnings("NullAway.Init")
  private Station station;

  @BeforeAll
  static void prepare() {
    Job.prepare(Station.open(prepared));
  }

  @BeforeEach
  void open() {
    station = new Station(prepared).copy(folder);
  }

  @Test
  void onePieceIsPlacedByOneOfEight() throws Exception {
    String file = station.file("one.csv", "slot,piece,facing_deg\n1,L-2404/7,0\n");
    List<Said> said =
        race(
            IntStream.rangeClosed(1, RACERS)
                .mapToObj(i -> List.of("place", "R-000" + i, file))
                .toList());
    int winner = winner(said);
    for (int i = 0; i < RACERS; i++) {
      String rotor = "R-000" + (i + 1);
      Said expected =
          i == winner
              ? new Said(
                  0,
                  "rotor " + rotor + ": 1 slot recorded, 1 of 12 filled\n",
                  "next: lodebook survey import " + rotor + " survey.csv --meter METER\n")
              : new Said(
                  4,
                  "",
                  """
                  one.csv:2:3: piece L-2404/0007 stands in rotor R-000%d, slot 1
                  nothing was changed
                  try: lodebook rotor show R-000%d
                  """
                      .formatted(winner + 1, winner + 1));
      assertEquals(expected, said.get(i));
    }
    assertWhole();
  }

  @Test
  void oneSlotIsFilledByOneOfEight() throws Exception {
    List<List<String>> commands = new ArrayList<>();
    for (int i = 1; i <= RACERS; i++) {
      String file = station.file("p" + i + ".csv", "slot,piece,facing_deg\n5,L-2404/" + i + ",0\n");
      commands.add(List.of("place", "R-0001", file));
    }
    List<Said> said = race(commands);
    int winner = winner(said);
    for (int i = 0; i < RACERS; i++) {
      if (i != winner) {
        String sentence =
            """
            p%d.csv:2:1: slot 5 of rotor R-0001 holds L-2404/000%d already; --rework says that the \
            magnet was changed, --correct that the record was wrong
            nothing was changed
            try: lodebook place R-0001 placements.csv --rework --why TEXT
            """
                .formatted(i + 1, winner + 1);
        assertEquals(new Said(4, "", sentence), said.get(i));
      }
    }
    assertWhole();
  }

  private List<Said> race(List<List<String>> commands) throws Exception {
    List<Process> racers = new ArrayList<>();
    try {
      for (List<String> command : commands) {
        Station aside = station.copy(folder.resolve("aside" + racers.size()));
        List<String> arguments = new ArrayList<>(List.of(aside.book().toString()));
        arguments.addAll(command);
        racers.add(station.process(AtTheGate.class, arguments).start());
      }
      for (Process racer : racers) {
        assertEquals(AtTheGate.READY, line(racer));
      }
      for (Process racer : racers) {
        racer.getOutputStream().write('\n');
        racer.getOutputStream().flush();
      }
      List<Said> said = new ArrayList<>();
      for (Process racer : racers) {
        said.add(station.end(racer));
      }
      return said;
    } finally {
      racers.forEach(Process::destroyForcibly);
    }
  }

  /// One line of a process, byte by byte so that nothing behind it is taken.
  private static String line(Process process) throws IOException {
    StringBuilder line = new StringBuilder();
    for (int c = process.getInputStream().read();
        c >= 0 && c != '\n';
        c = process.getInputStream().read()) {
      line.append((char) c);
    }
    return line.toString();
  }

  private static int winner(List<Said> said) {
    List<Integer> winners =
        IntStream.range(0, said.size()).filter(i -> said.get(i).code() == 0).boxed().toList();
    assertEquals(1, winners.size(), said::toString);
    return winners.getFirst();
  }

  private String assertWhole() {
    Said verified = station.run("book", "verify");
    assertEquals(0, verified.code(), verified::toString);
    return verified.out();
  }

  @Test
  void fourProcessesOfAHundredOperations() throws Exception {
    assertAllThere(4, 100);
  }

  @Test
  @Tag("slow")
  void fourProcessesOfFiveHundredOperations() throws Exception {
    assertAllThere(4, 500);
  }

  private void assertAllThere(int processes, int operations) throws Exception {
    int linesBefore = lines();
    long start = System.nanoTime();
    List<Process> running = new ArrayList<>();
    try {
      for (int p = 1; p <= processes; p++) {
        String aside = station.copy(folder.resolve("aside" + p)).book().toString();
        List<String> arguments = List.of(aside, "M-" + p + "-", String.valueOf(operations));
        running.add(station.process(ManyMeters.class, arguments).start());
      }
      for (Process process : running) {
        assertEquals(new Said(0, "", ""), station.end(process));
      }
    } finally {
      running.forEach(Process::destroyForcibly);
    }
    double seconds = (System.nanoTime() - start) / 1e9;
    String meters = station.does("meter", "list", "--json");
    for (int p = 1; p <= processes; p++) {
      for (int i = 1; i <= operations; i++) {
        String meter = "\"M-" + p + "-" + i + "\"";
        assertTrue(meters.contains(meter), () -> meter + " is lost");
      }
    }
    assertWhole();
    assertEquals(linesBefore + processes * operations, lines());
    assertGrowth(processes, operations, seconds);
  }

  private int lines() {
    String verified = station.does("book", "verify", "--json");
    Matcher lines = Pattern.compile("\"lines\":(\\d+)").matcher(verified);
    assertTrue(lines.find(), verified);
    return Integer.parseInt(lines.group(1));
  }

  /// Whoever leaves the book compacts it when it has grown too far.
  private void assertGrowth(int processes, int operations, double seconds) throws Exception {
    Path file = station.book().resolve("book.mv.db");
    long grown = Files.size(file);
    try (Connection connection =
            DriverManager.getConnection("jdbc:h2:" + station.book().resolve("book"), "sa", "");
        Statement statement = connection.createStatement()) {
      statement.execute("shutdown compact");
    }
    long compacted = Files.size(file);
    int all = processes * operations;
    String figures =
        "%d processes of %d operations: %.1f s, file of %d kB, %d kB when compacted"
            .formatted(processes, operations, seconds, grown / 1024, compacted / 1024);
    Files.writeString(Path.of("target", "race-" + all + ".txt"), figures + "\n");
    assertTrue(grown <= 3 * compacted, figures);
  }
}
