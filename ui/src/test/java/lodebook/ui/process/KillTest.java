package lodebook.ui.process;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Random;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.api.parallel.Execution;
import org.junit.jupiter.api.parallel.ExecutionMode;

/// Nothing is lost: the program is killed (SIGKILL) at random moments of its writing commands.
/// After each kill the book opens and is whole, the command is wholly there or wholly absent, and
/// there if it had answered; if absent, the same command is done now.
@Execution(ExecutionMode.CONCURRENT)
class KillTest {
  private static final int KILLED = 128 + 9;
  private static final List<Kill> TURNS = List.of(Kill.OPEN, Kill.ANSWERED, Kill.ANY, Kill.OPEN);

  private static final List<Job> JOBS = List.of(Job.values());

  @TempDir Path folder;
  private final Map<Job, Reference> references = new EnumMap<>(Job.class);
  private final KillTable table = new KillTable();

  /// What a job does when nobody kills it.
  ///
  /// @param command the command
  /// @param course its times in a process
  /// @param after what the book holds then, timeless
  private record Reference(List<String> command, Kill.Course course, Map<String, String> after) {}

  @Test
  void twentyKills() throws Exception {
    kill(20, 20_261);
  }

  @Test
  @Tag("slow")
  void twoHundredKills() throws Exception {
    kill(200, 20_262);
  }

  private void kill(int times, long seed) throws Exception {
    Station template = Station.open(Files.createDirectory(folder.resolve("template")));
    Job.prepare(template);
    Map<String, String> before = template.content();
    Aged.byAnHour(template.book().resolve("book.mv.db"));
    for (Job job : Job.values()) {
      references.put(job, reference(job, template, before));
    }
    Random random = new Random(seed);
    for (int i = 0; i < times; i++) {
      Job job = JOBS.get(i % JOBS.size());
      Kill when = TURNS.get(i / 3 % TURNS.size());
      double delay = when.delay(reference(job).course(), random);
      String trial =
          "seed %d, kill %d: %s, %s, %.3f s".formatted(seed, i, job.title(), when.words(), delay);
      Station station = template.copy(Files.createDirectory(folder.resolve("trial" + i)));
      try {
        trial(job, when, delay, station, before);
      } catch (AssertionError failed) {
        fail(trial + ": " + failed.getMessage(), failed);
      }
    }
  }

  private Reference reference(Job job) {
    return Objects.requireNonNull(references.get(job));
  }

  private Reference reference(Job job, Station template, Map<String, String> before)
      throws IOException, InterruptedException {
    Station station = template.copy(Files.createDirectory(folder.resolve("whole-" + job)));
    List<String> command = job.command(template);
    Victim spared = new Victim(station, command);
    Kill.Course course = spared.course();
    Said said = spared.said();
    assertEquals(0, said.code(), said::toString);
    Map<String, String> after = station.content();
    assertNotEquals(before, after);
    return new Reference(command, course, Job.timeless(after));
  }

  private void trial(Job job, Kill when, double delay, Station station, Map<String, String> before)
      throws Exception {
    Reference reference = reference(job);
    Victim victim = new Victim(station, reference.command());
    victim.kill(when, delay);
    Said said = victim.said();
    assertTrue(said.code() == KILLED || said.code() == 0, said::toString);
    boolean confirmed = !said.out().isEmpty();
    Said verified = station.run("book", "verify");
    assertEquals(0, verified.code(), verified::toString);
    assertEquals("", verified.err());
    Map<String, String> found = station.content();
    boolean absent = found.equals(before);
    if (absent) {
      assertTrue(!confirmed, () -> "answered, then lost: " + said);
      station.does(reference.command().toArray(String[]::new));
      found = station.content();
    }
    assertEquals(reference.after(), Job.timeless(found));
    table.count(job, when, said.code() == KILLED, victim.opened(), absent, confirmed);
    Files.writeString(Path.of("target", "kills.md"), table.text());
  }
}
