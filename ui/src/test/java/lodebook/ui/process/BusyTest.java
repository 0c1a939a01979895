package lodebook.ui.process;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.api.parallel.Execution;
import org.junit.jupiter.api.parallel.ExecutionMode;

/// A book that another process keeps open.
@Execution(ExecutionMode.CONCURRENT)
class BusyTest {
  @TempDir Path folder;

  @Test
  void whoeverWaitsInVainIsToldForWhomAndAKillGivesTheBookFree() throws Exception {
    Station station = Station.open(folder);
    String book = station.book().toString();
    Process holder = station.process(Holding.class, List.of(book)).start();
    try (BufferedReader said = holder.inputReader(StandardCharsets.UTF_8)) {
      assertEquals(AtTheGate.READY + " " + book, said.readLine());
      long start = System.nanoTime();
      Said waited = station.run("lot", "list");
      double seconds = (System.nanoTime() - start) / 1e9;
      assertEquals(
          new Said(
              5,
              "",
              "lodebook: the book at lodebook/book is busy with piece import (station BENCH-2,"
                  + " process %d); try again in a moment\ntry: lodebook book info\n"
                      .formatted(holder.pid())),
          waited);
      assertTrue(seconds >= 10, seconds + " s");
      assertTrue(holder.isAlive());
    } finally {
      holder.destroyForcibly().waitFor();
    }
    assertEquals(new Said(0, "there is no lot yet\n", ""), station.run("lot", "list"));
  }
}
