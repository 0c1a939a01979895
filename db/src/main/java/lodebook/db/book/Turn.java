package lodebook.db.book;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Duration;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.Semaphore;
import java.util.concurrent.locks.LockSupport;
import java.util.function.BooleanSupplier;
import lodebook.db.refusal.Refusal;

/// One process's turn at an embedded book: a lock of the operating system on `turn.lock`, which
/// goes with the process however it ends. `turn.who` beside it says who has it.
///
/// Whoever waits for the turn first waits for the place before it, a lock on `turn.next`, and gives
/// that up when the turn is his. So a process that does one operation after the other cannot take
/// the turn again before the one that waits has had it.
///
/// POSIX gives a process's lock up as soon as it closes any channel of the file. So of one process
/// only one thread at a time touches the files: the others wait for a permit.
final class Turn implements AutoCloseable {
  private static final Duration STEP = Duration.ofMillis(2);

  /// One permit for each book, for the threads of this process.
  private static final Map<Path, Semaphore> PERMITS = new ConcurrentHashMap<>();

  private final FileChannel channel;
  private final Semaphore permit;

  private Turn(FileChannel channel, Semaphore permit) {
    this.channel = channel;
    this.permit = permit;
  }

  /// Waits for the turn, at most the visit's patience; then refuses and names who has it.
  static Turn take(BookAddress.Folder folder, Visit visit) {
    long until = System.nanoTime() + visit.patience().toNanos();
    Semaphore permit = PERMITS.computeIfAbsent(real(folder), _ -> new Semaphore(1, true));
    if (!await(permit::tryAcquire, until)) {
      throw busy(folder);
    }
    try {
      return new Turn(channel(folder, visit, until), permit);
    } catch (RuntimeException refused) {
      permit.release();
      throw refused;
    }
  }

  private static Path real(BookAddress.Folder folder) {
    try {
      return folder.path().toRealPath();
    } catch (IOException failure) {
      throw noLock(folder, failure);
    }
  }

  private static FileChannel channel(BookAddress.Folder folder, Visit visit, long until) {
    FileChannel channel = open(folder, "turn.lock");
    try (FileChannel next = open(folder, "turn.next")) {
      if (!await(() -> lock(next), until) || !await(() -> lock(channel), until)) {
        throw busy(folder);
      }
      sayWho(folder, visit);
      return channel;
    } catch (IOException | UncheckedIOException failure) {
      closeQuietly(channel, failure);
      throw noLock(folder, failure);
    } catch (RuntimeException refused) {
      closeQuietly(channel, refused);
      throw refused;
    }
  }

  private static boolean lock(FileChannel channel) {
    try {
      return channel.tryLock() != null;
    } catch (IOException failure) {
      throw new UncheckedIOException(failure);
    }
  }

  private static Refusal noLock(BookAddress.Folder folder, Exception failure) {
    return Refusal.cannotOpen("book.no-lock", folder.shown(), failure.toString()).because(failure);
  }

  private static Refusal busy(BookAddress.Folder folder) {
    return Refusal.cannotOpen("book.busy", folder.shown(), holder(folder));
  }

  private static FileChannel open(BookAddress.Folder folder, String name) {
    try {
      return FileChannel.open(
          folder.path().resolve(name), StandardOpenOption.CREATE, StandardOpenOption.WRITE);
    } catch (AccessDeniedException denied) {
      throw Refusal.cannotOpen("book.not-writable", folder.shown()).because(denied);
    } catch (IOException failure) {
      throw noLock(folder, failure);
    }
  }

  private static boolean await(BooleanSupplier attempt, long until) {
    while (true) {
      if (attempt.getAsBoolean()) {
        return true;
      }
      if (System.nanoTime() - until >= 0) {
        return false;
      }
      LockSupport.parkNanos(STEP.toNanos());
    }
  }

  private static void sayWho(BookAddress.Folder folder, Visit visit) throws IOException {
    String who =
        "%s (station %s, process %d)"
            .formatted(visit.doing(), visit.station(), ProcessHandle.current().pid());
    Files.writeString(who(folder), who);
  }

  private static String holder(BookAddress.Folder folder) {
    try {
      String who = Files.readString(who(folder), StandardCharsets.UTF_8);
      return who.isBlank() ? "?" : who;
    } catch (IOException unreadable) {
      return "?";
    }
  }

  private static Path who(BookAddress.Folder folder) {
    return folder.path().resolve("turn.who");
  }

  private static void closeQuietly(FileChannel channel, Exception failure) {
    try {
      channel.close();
    } catch (IOException second) {
      failure.addSuppressed(second);
    }
  }

  @Override
  public void close() {
    try {
      channel.close();
    } catch (IOException failure) {
      throw new UncheckedIOException(failure);
    } finally {
      permit.release();
    }
  }
}
