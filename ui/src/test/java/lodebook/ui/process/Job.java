package lodebook.ui.process;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/// A writing command that is killed, with the file that it reads.
enum Job {
  /// Readings of 3000 pieces.
  PIECES("piece import", "readings.csv") {
    @Override
    String file() {
      StringBuilder text = new StringBuilder(READINGS);
      for (int i = 1; i <= 3000; i++) {
        text.append(i).append(",T-").append(i / 100).append(",C").append(i % 100);
        text.append(",3").append(20 + i % 9).append(".5,mT,1.5,20,GM-1\n");
      }
      return text.toString();
    }

    @Override
    List<String> command(String path) {
      return List.of("piece", "import", "L-3000", path);
    }
  },
  /// Every reading round a rotor, twenty times.
  SURVEY("survey import", "survey.csv") {
    @Override
    String file() {
      StringBuilder text = new StringBuilder("slot,spot,component,value,unit\n");
      for (int i = 0; i < 960; i++) {
        text.append(i % 12 + 1).append(i % 24 < 12 ? ",centre," : ",to-next,");
        text.append(i % 48 < 24 ? "radial," : "tangential,").append(i * 0.25).append(",mT\n");
      }
      return text.toString();
    }

    @Override
    List<String> command(String path) {
      return List.of("survey", "import", "R-0001", path, "--meter", "GM-1");
    }
  },
  /// Every magnet of a rotor.
  PLACE("place", "placements.csv") {
    @Override
    String file() {
      StringBuilder text = new StringBuilder("slot,piece,facing_deg\n");
      for (int i = 1; i <= 12; i++) {
        text.append(i).append(",L-2404/").append(i).append(',');
        text.append(360 - 90 * ((i - 1) % 4)).append('\n');
      }
      return text.toString();
    }

    @Override
    List<String> command(String path) {
      return List.of("place", "R-0002", path);
    }
  };

  static final String READINGS = "piece,tray,cell,value,unit,standoff_mm,temperature_C,meter\n";

  private final String title;
  private final String fileName;

  Job(String title, String fileName) {
    this.title = title;
    this.fileName = fileName;
  }

  abstract String file();

  abstract List<String> command(String path);

  String title() {
    return title;
  }

  /// Writes the job's file and returns the command.
  List<String> command(Station station) {
    return command(station.file(fileName, file()));
  }

  /// A book in which every job can be done.
  static void prepare(Station station) {
    station.does(
        "meter", "add", "GM-1", "--accuracy-percent", "1", "--calibration-due", "2099-12-31");
    station.does(
        "type", "import", station.file("types.csv", lodebook.ui.files.Example.TYPES.text()));
    station.does(
        "lot",
        "import",
        station.file(
            "lots.csv",
            """
            lot,type,supplier,received,count,certificate,certificate_br_mT,location
            L-2404,BLK-4-4-10,a supplier,2026-11-02,40,,1300,
            L-3000,BLK-4-4-10,a supplier,2026-11-02,3000,,1300,
            """));
    StringBuilder readings = new StringBuilder(READINGS);
    for (int i = 1; i <= 20; i++) {
      readings.append(i).append(",A,").append(i).append(",325.5,mT,1.5,20,GM-1\n");
    }
    station.does("piece", "import", "L-2404", station.file("few.csv", readings.toString()));
    station.does("lot", "accept", "L-2404", "--why", "fine");
    station.does(
        "layout", "import", station.file("layout.json", lodebook.ui.files.Example.LAYOUT.text()));
    station.does("layout", "release", "STIR-IN");
    for (int i = 1; i <= 8; i++) {
      station.does("rotor", "open", "STIR-IN", "--serial", "R-000" + i);
    }
  }

  /// What a book holds, without the moments and the sums over them: equal for two books in which
  /// the same was done at different times.
  static Map<String, String> timeless(Map<String, String> content) {
    Map<String, String> timeless = new TreeMap<>();
    content.forEach(
        (table, text) ->
            timeless.put(
                table,
                text.replaceAll("\\d{4}-\\d\\d-\\d\\d[T ]\\d\\d:\\d\\d[:.\\d]*Z?", "(time)")
                    .replaceAll("\\b[0-9a-f]{64}\\b", "(hash)")));
    return timeless;
  }
}
