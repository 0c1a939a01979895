package lodebook.ui.cli;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import lodebook.db.meters.Meter;
import lodebook.db.meters.MeterKind;
import lodebook.db.meters.Meters;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Adds an instrument.
@Command(
    name = "add",
    description = "Add an instrument.",
    footer = {
      "",
      "Example:",
      "  lodebook meter add GM-1 --accuracy-percent 1 --calibration-due 2027-06-30"
    })
final class MeterAdd extends Verb {
  @Parameters(paramLabel = "METER", description = "its number")
  private String code = "";

  @Option(names = "--kind", description = "field (default), length or torque")
  private String kind = "field";

  @Option(
      names = "--accuracy-percent",
      paramLabel = "P",
      required = true,
      description = "standard deviation of its gain, per cent")
  private double accuracyPercent;

  @Option(
      names = "--floor-mT",
      paramLabel = "F",
      description = "standard deviation of a reading near zero, mT")
  private double floorMilliTesla;

  @Option(
      names = "--sensing-depth-mm",
      paramLabel = "D",
      description = "depth of the sensing element below the probe's tip, mm")
  private double sensingDepthMillimetres;

  @Option(
      names = "--calibration-due",
      paramLabel = "DATE",
      required = true,
      description = "the day until which its calibration holds")
  private LocalDate due = LocalDate.EPOCH;

  MeterAdd(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<String> kinds = Arrays.stream(MeterKind.values()).map(MeterKind::word).toList();
    if (!kinds.contains(kind)) {
      throw wrongLine("line.not-one-of", "--kind", kind, String.join(", ", kinds));
    }
    Meter meter =
        new Meter(
            code,
            MeterKind.of(kind),
            accuracyPercent / 100,
            floorMilliTesla / 1000,
            sensingDepthMillimetres / 1000,
            due,
            false);
    session.change(book -> new Meters(book).add(session.act(), meter));
    session.done("meter.added", code, due);
    session.next("lodebook type import types.csv");
    return 0;
  }
}
