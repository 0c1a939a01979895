package lodebook.ui.cli;

import java.io.IOException;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import java.util.Locale;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RefusalKind;
import lodebook.db.refusal.RowsRefused;
import lodebook.ui.craft.PiecesShort;
import lodebook.ui.files.BadFile;
import lodebook.ui.files.Problem;
import org.jspecify.annotations.Nullable;

/// Turns every failure of a command into a sentence and an exit code; the only place that does.
final class Failures {
  static final int WRONG_LINE = 2;
  static final int WRONG_INPUT = 3;
  static final int REFUSED = 4;
  static final int DEFECT = 70;

  private final Session session;

  Failures(Session session) {
    this.session = session;
  }

  /// Says what failed.
  ///
  /// @return the exit code
  int handle(Throwable failure) {
    PrintStream err = session.around().err();
    return switch (failure) {
      case BadFile bad -> file(bad.problems(), bad.more(), example(), WRONG_INPUT);
      case FileRefused refused ->
          file(refused.problems(), refused.more(), refused.remedy(), refused.exitCode());
      case RowsRefused rows -> {
        rows.problems()
            .forEach(p -> err.println("lodebook: " + session.sentences().say(p.refusal())));
        sayRemedy(err, rows.problems().getFirst().refusal().remedy());
        yield rows.kind().exitCode();
      }
      case Refusal refusal -> {
        err.println("lodebook: " + session.sentences().say(refusal));
        sayRemedy(err, refusal.remedy() == null ? usual(refusal.kind()) : refusal.remedy());
        yield refusal.kind().exitCode();
      }
      case PiecesShort pieces -> {
        pieces
            .shortages()
            .forEach(
                s ->
                    err.println(
                        "lodebook: "
                            + session
                                .words()
                                .say(
                                    "plan.short",
                                    s.type(),
                                    s.missing(),
                                    s.needed(),
                                    s.available())));
        sayRemedy(err, "lodebook lot list");
        yield REFUSED;
      }
      case CannotWrite cannot -> {
        err.println(
            "lodebook: " + session.words().say("file.not-written", cannot.path(), cannot.reason()));
        yield WRONG_INPUT;
      }
      default -> defect(failure);
    };
  }

  private int file(List<Problem> problems, int more, @Nullable String remedy, int exitCode) {
    PrintStream err = session.around().err();
    problems.forEach(err::println);
    if (more > 0) {
      err.println(session.words().say("file.more", more));
    }
    err.println(session.words().say("file.nothing-changed"));
    sayRemedy(err, remedy);
    return exitCode;
  }

  private String example() {
    return "lodebook " + session.doing() + " --example FILE";
  }

  /// The command that helps where the refusal names none.
  private String usual(RefusalKind kind) {
    return kind == RefusalKind.CANNOT_OPEN
        ? "lodebook book info"
        : "lodebook help " + session.doing();
  }

  private void sayRemedy(PrintStream err, @Nullable String remedy) {
    if (remedy != null) {
      err.println(session.words().say("try", remedy));
    }
  }

  private int defect(Throwable failure) {
    StringWriter trace = new StringWriter();
    failure.printStackTrace(new PrintWriter(trace, true));
    String code = code(failure);
    Path log = session.around().defectLog();
    String entry =
        session.around().clock().instant() + " " + code + " " + session.doing() + "\n" + trace;
    PrintStream err = session.around().err();
    try {
      Files.createDirectories(log.getParent() == null ? Path.of(".") : log.getParent());
      Files.writeString(log, entry, StandardOpenOption.CREATE, StandardOpenOption.APPEND);
      err.println(session.words().say("defect", code, log));
    } catch (IOException unwritable) {
      err.println(session.words().say("defect.unlogged", code, log));
      err.print(trace);
    }
    return DEFECT;
  }

  /// A short code that is the same whenever the same place fails in the same way.
  static String code(Throwable failure) {
    StringBuilder place = new StringBuilder(failure.getClass().getName());
    for (StackTraceElement step : failure.getStackTrace()) {
      if (step.getClassName().startsWith("lodebook.")) {
        place.append('\n').append(step.getClassName()).append('.').append(step.getMethodName());
      }
    }
    try {
      byte[] hash =
          MessageDigest.getInstance("SHA-256")
              .digest(place.toString().getBytes(StandardCharsets.UTF_8));
      return "D-" + HexFormat.of().formatHex(hash, 0, 3).toUpperCase(Locale.ROOT);
    } catch (NoSuchAlgorithmException missing) {
      throw new IllegalStateException("every Java has SHA-256", missing);
    }
  }

  /// A file that the program was to write could not be written.
  static final class CannotWrite extends UncheckedIOException {
    private static final long serialVersionUID = 1;

    private final transient Path path;
    private final String reason;

    CannotWrite(Path path, IOException cause) {
      super(cause);
      this.path = path;
      this.reason = cause.toString();
    }

    Path path() {
      return path;
    }

    String reason() {
      return reason;
    }
  }
}
