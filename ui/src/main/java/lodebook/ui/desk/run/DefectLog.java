package lodebook.ui.desk.run;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.InstantSource;
import java.util.HexFormat;
import java.util.Locale;
import java.util.zip.CRC32;

/// The file in which defects of the program are written down.
public final class DefectLog {
  private final Path file;
  private final InstantSource clock;

  /// @param file the file; it is made when the first defect happens
  /// @param clock the one clock
  public DefectLog(Path file, InstantSource clock) {
    this.file = file;
    this.clock = clock;
  }

  /// Where it is.
  public Path file() {
    return file;
  }

  /// Writes a failure down with its trace.
  ///
  /// @return a short code that is the same whenever the same place fails in the same way; the code
  ///   alone where the file cannot be written
  String write(Throwable failure) {
    String code = code(failure);
    StringWriter trace = new StringWriter();
    failure.printStackTrace(new PrintWriter(trace, true));
    try {
      Path folder = file.toAbsolutePath().getParent();
      if (folder != null) {
        Files.createDirectories(folder);
      }
      Files.writeString(
          file,
          clock.instant() + " " + code + " desktop\n" + trace,
          StandardOpenOption.CREATE,
          StandardOpenOption.APPEND);
    } catch (IOException unwritable) {
      return code;
    }
    return code + ", " + file;
  }

  private static String code(Throwable failure) {
    StringBuilder place = new StringBuilder(failure.getClass().getName());
    for (StackTraceElement step : failure.getStackTrace()) {
      if (step.getClassName().startsWith("lodebook.")) {
        place.append('\n').append(step.getClassName()).append('.').append(step.getMethodName());
      }
    }
    CRC32 sum = new CRC32();
    sum.update(place.toString().getBytes(StandardCharsets.UTF_8));
    return "D-" + HexFormat.of().toHexDigits(sum.getValue(), 6).toUpperCase(Locale.ROOT);
  }
}
