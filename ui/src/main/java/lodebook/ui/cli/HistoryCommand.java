package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.List;
import lodebook.db.history.Histories;
import lodebook.db.history.HistoryEntry;
import lodebook.ui.words.Amounts;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Shows the history.
@Command(
    name = "history",
    description = "Show who did what and when, for all or for one number.",
    footer = {"", "Example:", "  lodebook history L-2404"})
final class HistoryCommand extends Verb {
  private static final int MOST_FIELDS = 4;

  @Parameters(
      arity = "0..1",
      paramLabel = "CODE",
      description = "a number of the shop, or a piece as LOT/NUMBER")
  private @Nullable String code;

  HistoryCommand(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<HistoryEntry> lines = session.read(book -> new Histories(book).list(code));
    Table table = new Table(">LINE", "WHEN", "BY", "DONE", "WITH");
    lines.forEach(
        l ->
            table.row(
                l.sequence(),
                Amounts.minute(l.statedAt(), session.zone()),
                l.initials(),
                l.operation(),
                with(l)));
    session.list(
        Json.list(lines.stream().map(HistoryCommand::json).toList()), table, "history.none");
    return 0;
  }

  private String with(HistoryEntry line) {
    List<String> said = new ArrayList<>();
    line.fields().forEach(f -> said.add(f.name() + " " + f.content()));
    if (line.rows() > 0) {
      said.add(session.words().say("history.rows", line.rows()));
    }
    if (said.size() > MOST_FIELDS) {
      return String.join(", ", said.subList(0, MOST_FIELDS)) + ", ...";
    }
    return String.join(", ", said);
  }

  private static Json json(HistoryEntry line) {
    Json fields = Json.object();
    line.fields().forEach(f -> fields.put(f.name(), f.content()));
    return Json.object()
        .put("line", line.sequence())
        .put("at", line.statedAt())
        .put("recordedAt", line.recordedAt())
        .put("by", line.initials())
        .put("station", line.station())
        .put("operation", line.operation())
        .put("fields", fields)
        .put("rows", line.rows())
        .put(
            "now",
            line.states().stream()
                .map(
                    s ->
                        Json.object()
                            .put("kind", s.kind())
                            .put("code", s.what())
                            .put("state", s.how()))
                .toList())
        .put("hash", line.hash());
  }
}
