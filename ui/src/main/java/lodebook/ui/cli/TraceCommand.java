package lodebook.ui.cli;

import java.util.List;
import lodebook.db.trace.Trace;
import lodebook.db.trace.TraceNode;
import lodebook.db.trace.Traces;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Traces a number both ways.
@Command(
    name = "trace",
    description = "Show what a number was made from and what it went into.",
    footer = {"", "Example:", "  lodebook trace U-0001"})
final class TraceCommand extends Verb {
  @Parameters(
      paramLabel = "CODE",
      description = "any number the shop uses: lot, supplier's lot, piece, rotor, unit ...")
  private String code = "";

  TraceCommand(Session session) {
    super(session);
  }

  @Override
  int run() {
    Trace trace = session.read(book -> new Traces(book).trace(code));
    if (!session.json(json(trace))) {
      session.say(text(trace));
    }
    return 0;
  }

  private String text(Trace trace) {
    StringBuilder text = new StringBuilder();
    text.append(trace.code()).append(" (").append(trace.kind());
    text.append(trace.state().isEmpty() ? "" : ", " + trace.state()).append(")\n");
    branch(text, "trace.made-from", trace.madeFrom());
    branch(text, "trace.went-into", trace.wentInto());
    branch(text, "trace.others", trace.others());
    return text.toString().stripTrailing();
  }

  private void branch(StringBuilder text, String key, List<TraceNode> nodes) {
    if (!nodes.isEmpty()) {
      text.append(session.words().say(key)).append('\n');
      lines(text, nodes, "  ");
    }
  }

  /// Nodes side by side that share their branches are followed by these, said once.
  private void lines(StringBuilder text, List<TraceNode> nodes, String indent) {
    int alike = 0;
    for (int i = 0; i < nodes.size(); i++) {
      TraceNode node = nodes.get(i);
      text.append(indent).append(line(node)).append('\n');
      alike++;
      if (i + 1 < nodes.size() && nodes.get(i + 1).branches().equals(node.branches())) {
        continue;
      }
      if (alike > 1 && !node.branches().isEmpty()) {
        text.append(indent).append(session.words().say("trace.each", alike)).append('\n');
      }
      lines(text, node.branches(), indent + "  ");
      alike = 0;
    }
  }

  private String line(TraceNode node) {
    StringBuilder line = new StringBuilder(node.code());
    line.append(" (").append(node.kind());
    line.append(node.state().isEmpty() ? "" : ", " + node.state()).append(')');
    if (node.magnets() != null) {
      line.append(", ").append(session.words().say("trace.magnets", node.magnets()));
    }
    if (node.from() != null) {
      line.append(' ').append(Amounts.minute(node.from(), session.zone()));
      line.append(node.to() == null ? "" : " to " + Amounts.minute(node.to(), session.zone()));
    }
    return line.toString();
  }

  private static Json json(Trace trace) {
    Json document =
        Json.object()
            .put("code", trace.code())
            .put("kind", trace.kind())
            .put("at", trace.at())
            .put("state", trace.state())
            .put("madeFrom", nodes(trace.madeFrom(), "madeFrom"))
            .put("wentInto", nodes(trace.wentInto(), "wentInto"));
    return trace.others().isEmpty()
        ? document
        : document.put("others", nodes(trace.others(), "madeFrom"));
  }

  private static List<Json> nodes(List<TraceNode> nodes, String key) {
    return nodes.stream().map(n -> node(n, key)).toList();
  }

  private static Json node(TraceNode node, String key) {
    Json json =
        Json.object()
            .put("code", node.code())
            .put("kind", node.kind())
            .put("at", node.at())
            .put("state", node.state());
    if (node.from() != null) {
      json.put("from", node.from()).put("to", node.to());
    }
    return json.putIfAny("count", node.magnets()).put(key, nodes(node.branches(), key));
  }
}
