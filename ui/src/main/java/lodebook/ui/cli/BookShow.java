package lodebook.ui.cli;

import java.util.TreeMap;
import lodebook.db.keep.BookInfo;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;

/// Shows what a book is.
@Command(
    name = "info",
    description = "Show where the book is, what it holds and the head of its history.",
    footer = {"", "Example:", "  lodebook book info"})
final class BookShow extends Verb {

  BookShow(Session session) {
    super(session);
  }

  @Override
  int run() {
    BookInfo info = session.read(BookInfo::of);
    if (!session.json(json(info))) {
      Table table =
          new Table("BOOK", info.name())
              .row("where", info.where())
              .row("made", Amounts.minute(info.created(), session.zone()))
              .row("head", info.head())
              .row("generation", info.generation())
              .row("people", info.people())
              .row("pieces", info.pieces());
      new TreeMap<>(info.things())
          .forEach((kind, count) -> table.row(session.words().say("things." + kind), count));
      session.say(table.text());
    }
    return 0;
  }

  private static Json json(BookInfo info) {
    Json things = Json.object();
    new TreeMap<>(info.things()).forEach(things::put);
    return Json.object()
        .put("book", info.name())
        .put("where", info.where())
        .put("createdAt", info.created())
        .put("generation", info.generation())
        .put("revision", info.revision())
        .put("head", info.head())
        .put("people", info.people())
        .put("pieces", info.pieces())
        .put("things", things);
  }
}
