package lodebook.ui.cli;

import java.util.List;
import lodebook.assembly.magnet.Strength;
import lodebook.db.stock.Piece;
import lodebook.db.stock.PieceName;
import lodebook.db.stock.PieceReading;
import lodebook.db.stock.Pieces;
import lodebook.db.stock.StateChange;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Shows a piece.
@Command(
    name = "show",
    description = "Show a piece, its readings and what was decided about it.",
    footer = {"", "Example:", "  lodebook piece show L-2404/0017"})
final class PieceShow extends Verb {
  @Parameters(paramLabel = "PIECE", description = "the piece, such as L-2404/0017")
  private String piece = "";

  PieceShow(Session session) {
    super(session);
  }

  @Override
  int run() {
    PieceName name = PieceName.of(piece);
    Piece found = session.read(book -> new Pieces(book).show(name));
    List<PieceReading> readings = session.read(book -> new Pieces(book).readings(name));
    List<StateChange> decisions = session.read(book -> new Pieces(book).decisions(name));
    Json document =
        json(found)
            .put("readings", readings.stream().map(PieceShow::json).toList())
            .put("decisions", Decisions.json(decisions));
    if (!session.json(document)) {
      session.say(text(found));
      session.say(readings(readings));
      session.say(Decisions.text(decisions, session));
    }
    return 0;
  }

  private static String text(Piece piece) {
    Strength strength = piece.strength();
    return new Table("PIECE", piece.name() + ", " + piece.state().word())
        .row(
            "Br at 20 C",
            strength == null
                ? "not measured"
                : Amounts.milliTesla(strength.remanenceTesla())
                    + " mT, standard uncertainty "
                    + Amounts.milliTesla(strength.standardUncertaintyTesla())
                    + " mT")
        .row(
            "lies",
            piece.lies() == null
                ? "-"
                : "tray " + piece.lies().tray() + " cell " + piece.lies().cell())
        .row("stands", PieceList.slot(piece.stands()))
        .row("planned", PieceList.slot(piece.planned()))
        .text();
  }

  private String readings(List<PieceReading> readings) {
    Table table = new Table("READ", "BY", ">mT", ">STANDOFF mm", ">C", "METER", "");
    readings.forEach(
        r ->
            table.row(
                Amounts.minute(r.statedAt(), session.zone()),
                r.by(),
                Amounts.milliTesla(r.fluxTesla()),
                Amounts.millimetres(r.standoffMetres()),
                r.temperatureCelsius() == null ? "-" : Amounts.plain(r.temperatureCelsius()),
                r.meter() == null ? "-" : r.meter(),
                r.doubted() ? "in doubt" : ""));
    return table.isEmpty() ? session.words().say("readings.none") : table.text();
  }

  static Json json(Piece piece) {
    Strength strength = piece.strength();
    return Json.object()
        .put("piece", piece.name())
        .put("state", piece.state().word())
        .put("remanenceMilliTesla", strength == null ? null : strength.remanenceTesla() * 1000)
        .put(
            "standardUncertaintyMilliTesla",
            strength == null ? null : strength.standardUncertaintyTesla() * 1000)
        .put("tray", piece.lies() == null ? null : piece.lies().tray())
        .put("cell", piece.lies() == null ? null : piece.lies().cell())
        .put("rotor", piece.stands() == null ? null : piece.stands().rotor())
        .put("slot", piece.stands() == null ? null : piece.stands().slot())
        .put("plannedRotor", piece.planned() == null ? null : piece.planned().rotor())
        .put("plannedSlot", piece.planned() == null ? null : piece.planned().slot());
  }

  private static Json json(PieceReading reading) {
    return Json.object()
        .put("fluxMilliTesla", reading.fluxTesla() * 1000)
        .put("standoffMillimetres", reading.standoffMetres() * 1000)
        .put("temperatureCelsius", reading.temperatureCelsius())
        .put("meter", reading.meter())
        .put("by", reading.by())
        .put("doubted", reading.doubted())
        .put("at", reading.statedAt())
        .put("recordedAt", reading.recordedAt());
  }
}
