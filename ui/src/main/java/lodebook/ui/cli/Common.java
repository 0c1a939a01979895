package lodebook.ui.cli;

import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;
import picocli.CommandLine.ScopeType;

/// The options that every command has.
final class Common {
  @Option(
      names = "--book",
      paramLabel = "PATH",
      scope = ScopeType.INHERIT,
      description =
          "the book: a folder or a jdbc:postgresql: address (else LODEBOOK_BOOK, else a folder in"
              + " the user's data directory)")
  @Nullable String book;

  @Option(
      names = "--by",
      paramLabel = "INITIALS",
      scope = ScopeType.INHERIT,
      description = "who does it (else LODEBOOK_BY)")
  @Nullable String by;

  @Option(
      names = "--json",
      scope = ScopeType.INHERIT,
      description = "print one JSON document on standard output and nothing else there")
  boolean json;

  @Option(
      names = "--quiet",
      scope = ScopeType.INHERIT,
      description = "no remarks and no next: line on standard error")
  boolean quiet;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      scope = ScopeType.INHERIT,
      description = "show this help")
  boolean help;
}
