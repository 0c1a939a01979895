package lodebook.ui.process;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.locks.LockSupport;
import lodebook.ui.Main;

/// The program doing a command in a process that may be killed.
final class Victim {
  private final Process process;
  private final long start = System.nanoTime();
  private final Path sign;
  private final CountDownLatch answered = new CountDownLatch(1);
  private final CompletableFuture<String> out;
  private final CompletableFuture<String> err;

  Victim(Station station, List<String> command) throws IOException {
    sign = station.book().resolve("turn.who");
    Files.deleteIfExists(sign);
    process = station.process(Main.class, command).start();
    process.getOutputStream().close();
    out = CompletableFuture.supplyAsync(() -> read(process.getInputStream(), answered));
    err =
        CompletableFuture.supplyAsync(() -> read(process.getErrorStream(), new CountDownLatch(1)));
  }

  /// Everything that came, however the process ended.
  private static String read(InputStream stream, CountDownLatch begun) {
    try (stream) {
      StringBuilder text = new StringBuilder();
      byte[] piece = new byte[4096];
      for (int n = stream.read(piece); n >= 0; n = stream.read(piece)) {
        text.append(new String(piece, 0, n, StandardCharsets.UTF_8));
        begun.countDown();
      }
      return text.toString();
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    } finally {
      begun.countDown();
    }
  }

  private double seconds() {
    return (System.nanoTime() - start) / 1e9;
  }

  /// Waits until it has opened its book, or is over.
  private void awaitOpen() {
    while (!Files.exists(sign) && process.isAlive()) {
      LockSupport.parkNanos(200_000);
    }
  }

  /// Lets it go on to its end.
  Kill.Course course() throws InterruptedException {
    awaitOpen();
    double open = seconds();
    process.waitFor();
    return new Kill.Course(open, seconds());
  }

  /// Kills it; a process that was faster ends by itself.
  void kill(Kill when, double delaySeconds) throws InterruptedException {
    switch (when) {
      case ANY -> {}
      case OPEN -> awaitOpen();
      case ANSWERED -> answered.await();
    }
    long until = System.nanoTime() + (long) (delaySeconds * 1e9);
    while (System.nanoTime() - until < 0 && process.isAlive()) {
      LockSupport.parkNanos(Math.min(200_000, Math.max(1, until - System.nanoTime())));
    }
    // through the handle: what it said before is still there to be read
    process.toHandle().destroyForcibly();
    process.waitFor();
  }

  /// What it said and how it ended, 137 when killed.
  Said said() throws InterruptedException {
    return new Said(process.waitFor(), out.join(), err.join());
  }

  /// Whether it had opened its book.
  boolean opened() {
    return Files.exists(sign);
  }
}
