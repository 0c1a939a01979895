package lodebook.ui.demo;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Consumer;
import lodebook.assembly.layout.Facing;
import tools.jackson.databind.JsonNode;

/// Walks the main job on a book of an invented workshop, by the same commands that a person would
/// type, and leaves files, papers and pictures to look at.
///
/// The magnets are those of the workshop's files; the gaussmeter is [PracticeGauge], which computes
/// what a meter would read.
public final class Demo {
  private final Walk walk;
  private final Workbench workbench;
  private final Path folder;

  /// @param runner runs commands on the demo's book
  /// @param workbench the demo's book, for the practice gauge
  /// @param tell takes the lines that a person reads
  /// @param folder where files, papers and pictures go
  public Demo(Runner runner, Workbench workbench, Consumer<String> tell, Path folder) {
    this.walk = new Walk(runner, tell, folder);
    this.workbench = workbench;
    this.folder = folder;
  }

  /// Walks the whole job.
  public void walk() {
    WorkshopFiles.into(folder.resolve("files"));
    stock();
    designs();
    List<BuiltRotor> rotors = plans();
    build(rotors);
    int wrong = rotors.getFirst().slotLyingAlong();
    surveys(rotors, wrong);
    units(rotors);
  }

  private void stock() {
    walk.run("book", "create");
    walk.told("A book is made for an invented workshop.");
    walk.run("person", "add", "MK", "--name", "Mira Kestrel");
    walk.run("person", "add", "TB", "--name", "Tomas Birk", "--role", "bench");
    walk.run(
        "meter",
        "add",
        "GM-1",
        "--accuracy-percent",
        "1",
        "--floor-mT",
        "0.5",
        "--sensing-depth-mm",
        "0.5",
        "--calibration-due",
        "2027-06-30");
    walk.told("Its first person leads, a second builds; a gaussmeter of 1 % is theirs.");
    walk.run("type", "import", "files/types.csv");
    walk.told("Two types of magnet: blocks 4 × 4 × 10 and 5 × 5 × 10 mm, grade N42.");
    walk.run("lot", "import", "files/lots.csv");
    walk.told("Two lots arrive and await inspection.");
    walk.run("piece", "import", "L-2404", "files/pieces-L-2404.csv");
    walk.run("piece", "import", "L-2407", "files/pieces-L-2407.csv");
    walk.told("60 pieces are measured; each gets its remanence with an uncertainty.");
    walk.run("lot", "accept", "L-2404", "--why", "readings agree with the certificate");
    walk.run("lot", "accept", "L-2407", "--why", "readings agree with the certificate");
    walk.told("The lots are accepted: their pieces may be planned and placed.");
  }

  private void designs() {
    walk.run("layout", "import", "files/layout-inner.json");
    walk.run("layout", "import", "files/layout-outer.json");
    walk.run("layout", "release", "STIR-IN");
    walk.run("layout", "release", "STIR-OUT");
    walk.run("layout", "picture", "STIR-IN", "--kind", "ring", "-o", "pictures/STIR-IN.png");
    walk.run("layout", "picture", "STIR-OUT", "--kind", "ring", "-o", "pictures/STIR-OUT.png");
    walk.told("Two rings: 12 slots with the field outside, 16 with the field inside; drawn.");
    walk.run("gear", "import", "files/gear.json");
    walk.run("gear", "release", "STIR");
    walk.told("The gear model; its rule holds: 3 + 4 pole pairs, 7 iron pieces.");
    walk.run("batch", "open", "B-31", "--gear", "STIR", "--count", "2");
    walk.told("A batch of two gears: four rotors get their numbers.");
  }

  private List<BuiltRotor> plans() {
    JsonNode plans = walk.json("plan", "--batch", "B-31", "--from", "L-2404,L-2407");
    List<BuiltRotor> rotors = new ArrayList<>();
    double planned = 0;
    double asTheyCome = 0;
    for (JsonNode plan : plans.get("plans")) {
      rotors.add(BuiltRotor.of(plan));
      planned = Math.max(planned, plan.get("unwantedHarmonics").asDouble());
      asTheyCome = Math.max(asTheyCome, plan.get("asTheyCome").asDouble());
    }
    walk.told(
        String.format(
            Locale.ROOT,
            "Every rotor is planned; unwanted harmonics at most %.2f %% (as they come: %.2f %%).",
            100 * planned,
            100 * asTheyCome));
    for (BuiltRotor rotor : rotors) {
      walk.run(
          "paper", "traveller", rotor.rotor(), "-o", "papers/traveller-" + rotor.rotor() + ".pdf");
    }
    walk.told("A traveller for each: what goes where, which way, what to expect, what hurts.");
    return rotors;
  }

  private void build(List<BuiltRotor> rotors) {
    for (BuiltRotor rotor : rotors) {
      String file = "files/placements-" + rotor.rotor() + ".csv";
      walk.write(file, rotor.placements(rotor.slots()));
      walk.run("place", rotor.rotor(), file, "--by", "TB");
    }
    walk.told("All four are built as planned - so the record says.");
  }

  private void surveys(List<BuiltRotor> rotors, int wrong) {
    BuiltRotor first = rotors.getFirst();
    String name = first.rotor();
    String file = "files/survey-" + name + ".csv";
    walk.write(file, readings(first, first.withReversed(wrong), 1));
    walk.run("survey", "import", name, file, "--meter", "GM-1", "--by", "TB");
    walk.told(
        "But in " + name + " one magnet went in backwards, among those lying along the ring.");
    JsonNode found = walk.json("survey", "check", name);
    JsonNode finding = found.get("findings").get(0);
    walk.told(
        String.format(
            Locale.ROOT,
            "The survey finds it: slot %d is %s (probability %.4f).",
            finding.get("slot").asInt(),
            finding.get("kind").asString(),
            finding.get("probability").asDouble()));
    require(
        found.get("verdict").asString().equals("fault") && finding.get("slot").asInt() == wrong);
    String rework = "files/rework-" + name + ".csv";
    walk.write(rework, first.placements(List.of(wrong)));
    walk.run(
        "place",
        name,
        rework,
        "--rework",
        "--why",
        "slot " + wrong + " stood the wrong way round, turned",
        "--by",
        "TB");
    walk.told("The magnet is taken out and turned; the record keeps both.");
    String again = "files/survey-" + name + "-again.csv";
    walk.write(again, readings(first, first.facings(), 2));
    walk.run("survey", "import", name, again, "--meter", "GM-1", "--by", "TB");
    require(walk.json("survey", "check", name).get("verdict").asString().equals("pass"));
    for (BuiltRotor rotor : rotors.subList(1, rotors.size())) {
      String other = "files/survey-" + rotor.rotor() + ".csv";
      walk.write(other, readings(rotor, rotor.facings(), 3));
      walk.run("survey", "import", rotor.rotor(), other, "--meter", "GM-1", "--by", "TB");
      require(walk.json("survey", "check", rotor.rotor()).get("verdict").asString().equals("pass"));
    }
    walk.told("Surveyed again it passes, and so do the other three.");
  }

  private String readings(BuiltRotor rotor, List<Facing> facings, long seed) {
    double[] remanences = workbench.remanencesTesla(rotor.pieces());
    return new PracticeGauge(workbench.design(rotor.rotor()), seed).survey(remanences, facings);
  }

  private void units(List<BuiltRotor> rotors) {
    for (int unit = 0; unit < 2; unit++) {
      walk.run(
          "unit",
          "assemble",
          "U-" + (101 + unit),
          "--gear",
          "STIR",
          "--inner",
          rotors.get(2 * unit).rotor(),
          "--outer",
          rotors.get(2 * unit + 1).rotor());
    }
    walk.told("Two gears are assembled.");
    walk.run("unit", "return", "U-101", "--complaint", "slips under load");
    walk.told("Months later one comes back.");
    List<String> lots = Trees.codes(walk.json("trace", "U-101").get("madeFrom"), "lot");
    walk.told("Its magnets came from lots " + String.join(" and ", lots) + ".");
    List<String> units = Trees.codes(walk.json("trace", lots.getFirst()).get("wentInto"), "unit");
    units.remove("U-101");
    walk.told("Lot " + lots.getFirst() + " is also in " + String.join(", ", units) + ": stop it.");
    require(units.equals(List.of("U-102")));
  }

  private static void require(boolean held) {
    if (!held) {
      throw new IllegalStateException("the demo did not find what it must find");
    }
  }
}
