package lodebook.db.refusal;

import org.jspecify.annotations.Nullable;

/// The book does not do it. The operation that throws this has changed nothing.
///
/// [#getMessage()] is the English sentence, for logs; people get theirs from [Sentences].
public class Refusal extends RuntimeException {
  private static final long serialVersionUID = 1;

  private final RefusalKind kind;
  private final transient Notice notice;
  private final @Nullable String remedy;

  /// A refusal.
  ///
  /// @param kind which decides the exit code
  /// @param notice what was refused and why
  /// @param remedy the command that helps, such as `lodebook lot list`, or null where there is none
  public Refusal(RefusalKind kind, Notice notice, @Nullable String remedy) {
    super(Sentences.english().say(notice));
    this.kind = kind;
    this.notice = notice;
    this.remedy = remedy;
  }

  /// What was handed in is wrong in itself (exit code 3).
  public static Refusal wrongInput(String key, @Nullable Object... arguments) {
    return new Refusal(RefusalKind.WRONG_INPUT, Notice.of(key, arguments), null);
  }

  /// What the book holds does not allow it (exit code 4).
  public static Refusal refused(String key, @Nullable Object... arguments) {
    return new Refusal(RefusalKind.REFUSED, Notice.of(key, arguments), null);
  }

  /// The book cannot be opened (exit code 5).
  public static Refusal cannotOpen(String key, @Nullable Object... arguments) {
    return new Refusal(RefusalKind.CANNOT_OPEN, Notice.of(key, arguments), null);
  }

  /// The same refusal that names the command that helps.
  public Refusal remedy(String command) {
    Refusal helped = new Refusal(kind, notice, command);
    helped.setStackTrace(getStackTrace());
    if (getCause() != null) {
      helped.initCause(getCause());
    }
    return helped;
  }

  /// The same refusal with the failure that led to it.
  public Refusal because(Throwable cause) {
    Refusal explained = new Refusal(kind, notice, remedy);
    explained.initCause(cause);
    return explained;
  }

  /// The English sentence, without the remedy.
  @Override
  public String getMessage() {
    return String.valueOf(super.getMessage());
  }

  /// What kind of refusal it is.
  public RefusalKind kind() {
    return kind;
  }

  /// What was refused and why.
  public Notice notice() {
    return notice;
  }

  /// The command that helps, or null.
  public @Nullable String remedy() {
    return remedy;
  }
}
