package lodebook.ui.cli;

import java.time.Instant;
import lodebook.db.units.GearUnit;
import lodebook.db.units.Units;
import lodebook.ui.words.Amounts;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Shows a gear.
@Command(
    name = "show",
    description = "Show a gear, what is in it and what happened to it.",
    footer = {"", "Example:", "  lodebook unit show U-0001"})
final class UnitShow extends Verb {
  @Parameters(paramLabel = "UNIT", description = "its number")
  private String code = "";

  UnitShow(Session session) {
    super(session);
  }

  @Override
  int run() {
    GearUnit unit = session.read(book -> new Units(book).show(code));
    if (!session.json(json(unit))) {
      session.say(
          new Table("UNIT", unit.code() + ", " + unit.state())
              .row("gear", unit.gear())
              .row("batch", RotorList.dash(unit.batch()))
              .text());
      Table members = new Table("MEMBER", "POSITION", "FROM", "TO", "WHY");
      unit.members()
          .forEach(m -> members.row(m.code(), m.position(), time(m.from()), time(m.to()), m.why()));
      session.say(members.text());
      Table events = new Table("WHEN", "BY", "STATE", "WHY");
      unit.events().forEach(e -> events.row(time(e.at()), e.by(), e.state(), e.why()));
      session.say(events.text());
    }
    return 0;
  }

  private String time(@Nullable Instant time) {
    return time == null ? "-" : Amounts.minute(time, session.zone());
  }

  static Json json(GearUnit unit) {
    return Json.object()
        .put("unit", unit.code())
        .put("gear", unit.gear())
        .put("batch", unit.batch())
        .put("state", unit.state())
        .put("assembledAt", unit.assembledAt())
        .put(
            "members",
            unit.members().stream()
                .map(
                    m ->
                        Json.object()
                            .put("code", m.code())
                            .put("position", m.position())
                            .put("from", m.from())
                            .put("to", m.to())
                            .put("why", m.why()))
                .toList())
        .put(
            "events",
            unit.events().stream()
                .map(
                    e ->
                        Json.object()
                            .put("state", e.state())
                            .put("why", e.why())
                            .put("by", e.by())
                            .put("at", e.at()))
                .toList());
  }
}
