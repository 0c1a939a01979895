package lodebook.assembly.survey;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.URISyntaxException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.TreeSet;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.layout.Spread;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;
import lodebook.assembly.magnet.Strength;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.ObjectMapper;

/// A survey with its truth, read from a folder of the seed data.
record SurveyCase(
    String name,
    SurveyedRing ring,
    List<Reading> readings,
    Set<NamedFault> faults,
    Measuring measuring) {
  private static final String ROOT = "/lodebook/seed/cases";
  private static final double NDFEB_PER_KELVIN = -0.0012;
  private static final double NO_METER_ACCURACY = 0.01;
  private static final Meter METER = new Meter("bench", 0.01, 0);

  /// Names of all case folders.
  static List<String> names() throws IOException, URISyntaxException {
    URI root = SurveyCase.class.getResource(ROOT).toURI();
    if (root.getScheme().equals("jar")) {
      try (FileSystem jar = FileSystems.newFileSystem(root, Map.of())) {
        return folders(jar.getPath(ROOT));
      }
    }
    return folders(Path.of(root));
  }

  private static List<String> folders(Path root) throws IOException {
    try (var list = Files.list(root)) {
      return list.map(p -> p.getFileName().toString().replace("/", "")).sorted().toList();
    }
  }

  static SurveyCase read(String name) {
    MagnetType type = type(table(name, "types.csv").getFirst());
    Layout layout = layout(json(name, "layout.json"));
    JsonNode expected = json(name, "expected.json");
    Set<NamedFault> faults =
        new TreeSet<>(Comparator.comparingInt(NamedFault::slot).thenComparing(NamedFault::kind));
    for (JsonNode fault : expected.get("faults")) {
      faults.add(new NamedFault(fault.get("slot").asInt(), kind(fault.get("kind").asString())));
    }
    RingDesign design = new RingDesign(layout, type, null);
    return new SurveyCase(
        name,
        new SurveyedRing(design, magnets(name, type)),
        readings(name),
        faults,
        measuring(expected.get("measuring")));
  }

  private static Map<Integer, PlacedMagnet> magnets(String name, MagnetType type) {
    Map<String, PlacedMagnet> pieces = new HashMap<>();
    for (Line line : table(name, "pieces.csv")) {
      double share = onAxis(type, line.number("standoff_mm") / 1000);
      double tesla = line.number("value") / 1000 / share;
      pieces.put(
          line.text("piece"),
          new PlacedMagnet(new Strength(tesla, NO_METER_ACCURACY * tesla), NDFEB_PER_KELVIN));
    }
    Map<Integer, PlacedMagnet> magnets = new HashMap<>();
    for (Line line : table(name, "placements.csv")) {
      String piece = line.text("piece").replaceAll(".*/0*", "");
      magnets.put((int) line.number("slot"), Objects.requireNonNull(pieces.get(piece), piece));
    }
    return magnets;
  }

  /// Flux density on the axis of a block over its pole face, per tesla of remanence: textbook
  /// closed form.
  private static double onAxis(MagnetType type, double z) {
    double w = type.widthMetres();
    double l = type.lengthMetres();
    double far = z + type.thicknessMetres();
    return (Math.atan(w * l / (2 * z * Math.sqrt(4 * z * z + w * w + l * l)))
            - Math.atan(w * l / (2 * far * Math.sqrt(4 * far * far + w * w + l * l))))
        / Math.PI;
  }

  private static List<Reading> readings(String name) {
    List<Reading> readings = new ArrayList<>();
    for (Line row : table(name, "survey.csv")) {
      readings.add(
          new Reading(
              (int) row.number("slot"),
              row.text("spot").equals("centre") ? Spot.CENTRE : Spot.TO_NEXT,
              row.text("component").equals("radial") ? Component.RADIAL : Component.TANGENTIAL,
              row.number("value") / 1000,
              StatedUnit.TESLA,
              null,
              null,
              null,
              METER));
    }
    return readings;
  }

  private static Measuring measuring(JsonNode node) {
    return new Measuring(
        node.get("sign").asString().equals("inverted")
            ? Measuring.Sign.INVERTED
            : Measuring.Sign.AS_SET,
        node.get("startSlot").asInt(),
        node.get("direction").asString().equals("opposite")
            ? Measuring.Direction.OPPOSITE
            : Measuring.Direction.AS_NUMBERED,
        Arrays.stream(Measuring.UnitSlip.values())
            .filter(u -> u.word().equals(node.get("unit").asString()))
            .findFirst()
            .orElseThrow());
  }

  private static FaultKind kind(String word) {
    return Arrays.stream(FaultKind.values())
        .filter(k -> k.word().equals(word))
        .findFirst()
        .orElseThrow();
  }

  private static MagnetType type(Line row) {
    return new MagnetType(
        row.text("type"),
        Shape.BLOCK,
        row.number("thickness_mm") / 1000,
        row.number("width_mm") / 1000,
        row.number("length_mm") / 1000,
        0,
        0,
        0,
        row.text("grade"),
        row.number("tolerance_mm") / 1000,
        row.text("coating"),
        row.number("recoil_permeability"),
        0);
  }

  private static Layout layout(JsonNode json) {
    JsonNode probe = json.get("probe");
    JsonNode spread = json.get("spread");
    List<Component> components = new ArrayList<>();
    for (JsonNode word : probe.get("components")) {
      components.add(word.asString().equals("radial") ? Component.RADIAL : Component.TANGENTIAL);
    }
    return new Layout(
        json.get("layout").asString(),
        json.get("revision").asString(),
        json.get("polePairs").asInt(),
        json.get("segmentsPerPolePair").asInt(),
        json.get("focus").asString().equals("in") ? Focus.IN : Focus.OUT,
        Numbering.COUNTERCLOCKWISE,
        json.get("firstSlotClockDegrees").asDouble(),
        new Facing(json.get("firstFacingDegrees").asDouble()),
        json.get("slotRadiusMillimetres").asDouble() / 1000,
        json.get("magnetType").asString(),
        null,
        json.get("workingRadiusMillimetres").asDouble() / 1000,
        new Probe(
            probe.get("radiusMillimetres").asDouble() / 1000,
            probe.get("heightMillimetres").asDouble() / 1000,
            List.of(Spot.CENTRE),
            components),
        new Spread(
            spread.get("pocketMillimetres").asDouble() / 1000,
            spread.get("facingDegrees").asDouble(),
            spread.get("probeMillimetres").asDouble() / 1000,
            spread.get("probeTiltDegrees").asDouble()),
        json.get("adhesive").asString(),
        null,
        json.get("bodyTurns").asBoolean(),
        InsertFrom.FACE,
        0.03);
  }

  private static JsonNode json(String name, String file) {
    return new ObjectMapper().readTree(text(name, file));
  }

  /// One line of a table by the names of its columns.
  private record Line(Map<String, String> cells) {
    String text(String column) {
      return Objects.requireNonNull(cells.get(column), column);
    }

    double number(String column) {
      return Double.parseDouble(text(column));
    }
  }

  private static List<Line> table(String name, String file) {
    List<String> lines = text(name, file).lines().toList();
    String[] heads = lines.getFirst().split(",", -1);
    List<Line> rows = new ArrayList<>();
    for (String line : lines.subList(1, lines.size())) {
      String[] cells = line.split(",", -1);
      Map<String, String> row = new HashMap<>();
      for (int i = 0; i < heads.length; i++) {
        row.put(heads[i], cells[i]);
      }
      rows.add(new Line(row));
    }
    return rows;
  }

  private static String text(String name, String file) {
    try (InputStream in = SurveyCase.class.getResourceAsStream(ROOT + "/" + name + "/" + file)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
