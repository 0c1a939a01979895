package lodebook.db.keep;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/// What a backup says of itself: `manifest.csv`, one line each, `name,number,text`.
///
/// @param generation generation of the tables
/// @param head head of the history
/// @param tables how many rows each table has and the SHA-256 of its CSV
record Manifest(long generation, Head head, Map<String, Table> tables) {
  static final String NAME = "manifest.csv";
  private static final String FORMAT = "lodebook backup,1,";

  /// What is said of a table.
  record Table(long rows, String sha256) {}

  String text() {
    StringBuilder text = new StringBuilder(FORMAT).append('\n');
    text.append("generation,").append(generation).append(",\n");
    text.append("head,").append(head.sequence()).append(',').append(head.digits()).append('\n');
    tables.forEach(
        (name, table) ->
            text.append(name)
                .append(',')
                .append(table.rows())
                .append(',')
                .append(table.sha256())
                .append('\n'));
    return text.toString();
  }

  /// Reads a manifest.
  ///
  /// @throws IllegalArgumentException if it is none
  static Manifest parse(String text) {
    List<String[]> lines = text.lines().map(line -> line.split(",", -1)).toList();
    if (lines.size() < 3
        || !String.join(",", lines.getFirst()).equals(FORMAT)
        || lines.stream().anyMatch(line -> line.length != 3)) {
      throw new IllegalArgumentException("the manifest is none of a backup");
    }
    Map<String, Table> tables = new LinkedHashMap<>();
    for (String[] line : lines.subList(3, lines.size())) {
      tables.put(line[0], new Table(Long.parseLong(line[1]), line[2]));
    }
    return new Manifest(
        Long.parseLong(lines.get(1)[1]),
        new Head(Long.parseLong(lines.get(2)[1]), lines.get(2)[2]),
        tables);
  }
}
