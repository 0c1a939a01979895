package lodebook.ui.cli;

import java.util.List;
import lodebook.db.keep.Head;
import lodebook.db.keep.Verification;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/// Proves that a book is whole.
@Command(
    name = "verify",
    description =
        "Prove that the book is whole; exit code 1 where something was changed behind its back.",
    footer = {"", "Example:", "  lodebook book verify --expect-head 1024-9f3c01ab"})
final class BookVerify extends Verb {
  @Option(
      names = "--expect-head",
      paramLabel = "HEAD",
      description = "a head printed earlier that must be in the history")
  private @Nullable String head;

  BookVerify(Session session) {
    super(session);
  }

  @Override
  int run() {
    Head expected = head == null ? null : Head.parse(head);
    Verification.Outcome found = session.read(book -> Verification.of(book, expected));
    List<String> faults = found.faults().stream().map(session.sentences()::say).toList();
    Json document =
        Json.object()
            .put("whole", faults.isEmpty())
            .put("head", found.head())
            .put("lines", found.lines())
            .put("faults", faults);
    if (!session.json(document)) {
      faults.forEach(session::say);
      session.tell(faults.isEmpty() ? "book.whole" : "book.not-whole", found.lines(), found.head());
    }
    return faults.isEmpty() ? 0 : 1;
  }
}
