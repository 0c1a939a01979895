package lodebook.ui.process;

import java.util.EnumMap;
import java.util.Map;

/// What became of the commands that were killed.
final class KillTable {
  private static final int COLUMNS = 6;

  private final Map<Job, Map<Kill, int[]>> rows = new EnumMap<>(Job.class);

  void count(
      Job job, Kill when, boolean killed, boolean opened, boolean absent, boolean confirmed) {
    int[] row =
        rows.computeIfAbsent(job, _ -> new EnumMap<>(Kill.class))
            .computeIfAbsent(when, _ -> new int[COLUMNS]);
    row[0]++;
    row[!killed ? 5 : absent ? (opened ? 2 : 1) : confirmed ? 4 : 3]++;
  }

  /// The table in Markdown.
  String text() {
    StringBuilder text =
        new StringBuilder(
            """
            | command | killed | trials | absent, book not opened yet | absent, book open | wholly there, not answered | wholly there, answered | ended before the kill |
            | --- | --- | --- | --- | --- | --- | --- | --- |
            """);
    rows.forEach(
        (job, kills) ->
            kills.forEach(
                (when, row) -> {
                  text.append("| ").append(job.title()).append(" | ").append(when.words());
                  for (int count : row) {
                    text.append(" | ").append(count);
                  }
                  text.append(" |\n");
                }));
    return text.toString();
  }
}
