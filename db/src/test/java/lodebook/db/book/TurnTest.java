package lodebook.db.book;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import lodebook.db.TestBook;
import lodebook.db.refusal.Refusal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class TurnTest {
  @TempDir Path folder;

  /// Closing a channel of the lock's file would give the whole process's lock up.
  @Test
  void whoWaitedInVainInThisProcessTakesNobodysTurnAway() throws Exception {
    BookAddress.Folder book = new BookAddress.Folder(folder);
    Visit hasty = new Visit("BENCH-2", "lot list", TestBook.visit().clock(), Duration.ofMillis(20));
    try (Turn _ = Turn.take(book, TestBook.visit())) {
      assertThrows(Refusal.class, () -> Turn.take(book, hasty).close());
      assertEquals("taken", askedByAnotherProcess());
    }
    assertEquals("free", askedByAnotherProcess());
    Turn.take(book, hasty).close();
  }

  private String askedByAnotherProcess() throws IOException, InterruptedException {
    Process other =
        new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-cp",
                System.getProperty("java.class.path"),
                LockProbe.class.getName(),
                folder.resolve("turn.lock").toString())
            .redirectError(ProcessBuilder.Redirect.INHERIT)
            .start();
    String said = new String(other.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertEquals(0, other.waitFor());
    return said.strip();
  }
}
