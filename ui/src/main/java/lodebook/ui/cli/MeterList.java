package lodebook.ui.cli;

import java.time.LocalDate;
import java.util.List;
import lodebook.db.meters.Meter;
import lodebook.db.meters.Meters;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;

/// Lists the instruments.
@Command(
    name = "list",
    description = "List the instruments.",
    footer = {"", "Example:", "  lodebook meter list"})
final class MeterList extends Verb {

  MeterList(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<Meter> meters = session.read(book -> new Meters(book).list());
    LocalDate today = LocalDate.now(session.around().clock());
    Table table = new Table("METER", "KIND", ">ACCURACY %", ">FLOOR mT", "CALIBRATED UNTIL", "");
    meters.forEach(
        m ->
            table.row(
                m.code(),
                m.kind().word(),
                Amounts.percent(m.accuracyRelative()),
                Amounts.plain(m.floorTesla() * 1000),
                m.calibrationDue() == null ? "-" : m.calibrationDue(),
                remark(m, today)));
    session.list(Json.list(meters.stream().map(MeterList::json).toList()), table, "meter.none");
    return 0;
  }

  private static String remark(Meter meter, LocalDate today) {
    if (meter.retired()) {
      return "retired";
    }
    LocalDate due = meter.calibrationDue();
    return due != null && due.isBefore(today) ? "overdue" : "";
  }

  private static Json json(Meter meter) {
    return Json.object()
        .put("meter", meter.code())
        .put("kind", meter.kind().word())
        .put("accuracyPercent", meter.accuracyRelative() * 100)
        .put("floorMilliTesla", meter.floorTesla() * 1000)
        .put("sensingDepthMillimetres", meter.sensingDepthMetres() * 1000)
        .put("calibrationDue", meter.calibrationDue())
        .put("retired", meter.retired());
  }
}
