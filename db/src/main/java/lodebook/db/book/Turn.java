package lodebook.db.book;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Duration;
import java.util.concurrent.locks.LockSupport;
import lodebook.db.refusal.Refusal;
import org.jspecify.annotations.Nullable;

/// One process's turn at an embedded book: a lock of the operating system on `turn.lock`, which
/// goes with the process however it ends. `turn.who` beside it says who has it.
///
/// Whoever waits for the turn first waits for the place before it, a lock on `turn.next`, and gives
/// that up when the turn is his. So a process that does one operation after the other cannot take
/// the turn again before the one that waits has had it.
final class Turn implements AutoCloseable {
  private static final Duration STEP = Duration.ofMillis(2);

  private final FileChannel channel;

  private Turn(FileChannel channel) {
    this.channel = channel;
  }

  /// Waits for the turn, at most the visit's patience; then refuses and names who has it.
  static Turn take(BookAddress.Folder folder, Visit visit) {
    long until = System.nanoTime() + visit.patience().toNanos();
    FileChannel channel = open(folder, "turn.lock");
    try (FileChannel next = open(folder, "turn.next")) {
      if (!await(next, until) || !await(channel, until)) {
        throw Refusal.cannotOpen("book.busy", folder.shown(), holder(folder));
      }
      Turn turn = new Turn(channel);
      sayWho(folder, visit);
      return turn;
    } catch (IOException | RuntimeException failure) {
      closeQuietly(channel, failure);
      if (failure instanceof RuntimeException unchecked) {
        throw unchecked;
      }
      throw Refusal.cannotOpen("book.no-lock", folder.shown(), failure.toString()).because(failure);
    }
  }

  private static FileChannel open(BookAddress.Folder folder, String name) {
    try {
      return FileChannel.open(
          folder.path().resolve(name), StandardOpenOption.CREATE, StandardOpenOption.WRITE);
    } catch (AccessDeniedException denied) {
      throw Refusal.cannotOpen("book.not-writable", folder.shown()).because(denied);
    } catch (IOException failure) {
      throw Refusal.cannotOpen("book.no-lock", folder.shown(), failure.toString()).because(failure);
    }
  }

  private static boolean await(FileChannel channel, long until) throws IOException {
    while (true) {
      if (tryLock(channel) != null) {
        return true;
      }
      if (System.nanoTime() - until >= 0) {
        return false;
      }
      LockSupport.parkNanos(STEP.toNanos());
    }
  }

  private static @Nullable FileLock tryLock(FileChannel channel) throws IOException {
    try {
      return channel.tryLock();
    } catch (OverlappingFileLockException sameProcess) {
      return null;
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
      throw new java.io.UncheckedIOException(failure);
    }
  }
}
