package lodebook.ui.files;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/// What is wrong in one JSON file.
final class JsonProblems {
  private final Source source;
  private final List<Problem> noted = new ArrayList<>();

  JsonProblems(Source source) {
    this.source = source;
  }

  /// Notes a problem.
  void note(Place place, String key, Object... arguments) {
    noted.add(source.problem(place, key, arguments));
  }

  /// A sentence of the bundle.
  String say(String key, Object... arguments) {
    return source.words().say(key, arguments);
  }

  /// Throws if anything was noted.
  void throwIfAny() {
    if (!noted.isEmpty()) {
      List<Problem> sorted =
          noted.stream()
              .sorted(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column))
              .limit(BadFile.SHOWN)
              .toList();
      throw new BadFile(sorted, noted.size());
    }
  }
}
