package lodebook.ui.cli;

import java.util.List;
import lodebook.db.stock.StateChange;
import lodebook.ui.words.Amounts;

/// What was decided about a lot or a piece, in words and as JSON.
final class Decisions {
  private Decisions() {}

  static String text(List<StateChange> decisions, Session session) {
    if (decisions.isEmpty()) {
      return session.words().say("decisions.none");
    }
    Table table = new Table("WHEN", "BY", "DECIDED", "WHY");
    decisions.forEach(
        d -> table.row(Amounts.minute(d.statedAt(), session.zone()), d.by(), d.state(), d.why()));
    return table.text();
  }

  static List<Json> json(List<StateChange> decisions) {
    return decisions.stream()
        .map(
            d ->
                Json.object()
                    .put("state", d.state())
                    .put("why", d.why())
                    .put("by", d.by())
                    .put("at", d.statedAt())
                    .put("recordedAt", d.recordedAt()))
        .toList();
  }
}
