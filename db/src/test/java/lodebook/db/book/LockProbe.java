package lodebook.db.book;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.channels.FileChannel;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;

/// Says whether another process holds the lock on a file.
final class LockProbe {
  private LockProbe() {}

  /// @param arguments the file
  public static void main(String[] arguments) throws IOException {
    PrintStream out = System.out;
    try (FileChannel channel = FileChannel.open(Path.of(arguments[0]), StandardOpenOption.WRITE)) {
      out.println(channel.tryLock() == null ? "taken" : "free");
    }
  }
}
