package lodebook.ui.cli;

import java.util.List;
import lodebook.db.stock.Lot;
import lodebook.db.stock.Lots;
import lodebook.db.stock.NewLot;
import lodebook.db.stock.StateChange;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Shows a lot.
@Command(
    name = "show",
    description = "Show a lot and what was decided about it.",
    footer = {"", "Example:", "  lodebook lot show L-2404"})
final class LotShow extends Verb {
  @Parameters(paramLabel = "LOT", description = "number of the lot")
  private String code = "";

  LotShow(Session session) {
    super(session);
  }

  @Override
  int run() {
    Lot lot = session.read(book -> new Lots(book).show(code));
    List<StateChange> decisions = session.read(book -> new Lots(book).decisions(code));
    if (!session.json(json(lot).put("decisions", Decisions.json(decisions)))) {
      session.say(text(lot));
      session.say(Decisions.text(decisions, session));
    }
    return 0;
  }

  private static String text(Lot lot) {
    NewLot received = lot.received();
    Double remanence = received.certificateRemanenceTesla();
    return new Table("LOT", lot.code() + ", " + lot.state().words())
        .row("type", received.type())
        .row("supplier", received.supplier())
        .row("supplier's lot", received.supplierLot())
        .row("received", received.received())
        .row("certificate", received.certificate())
        .row("Br by it", remanence == null ? "-" : Amounts.milliTesla(remanence) + " mT")
        .row("lies", received.location())
        .row("count", received.count() + ", " + lot.left() + " left")
        .row("measured", lot.measured())
        .row("placed", lot.placed())
        .row("on hold", lot.held())
        .row("scrapped", lot.scrapped())
        .text();
  }

  static Json json(Lot lot) {
    NewLot received = lot.received();
    Double remanence = received.certificateRemanenceTesla();
    return Json.object()
        .put("lot", lot.code())
        .put("type", received.type())
        .put("state", lot.state().word())
        .put("supplier", received.supplier())
        .put("supplierLot", received.supplierLot())
        .put("received", received.received())
        .put("certificate", received.certificate())
        .put("certificateRemanenceMilliTesla", remanence == null ? null : remanence * 1000)
        .put("location", received.location())
        .put("count", received.count())
        .put("measured", lot.measured())
        .put("placed", lot.placed())
        .put("held", lot.held())
        .put("scrapped", lot.scrapped())
        .put("left", lot.left());
  }
}
