package lodebook.ui.files;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/// The objects of a JSON file that is right in itself, each with the places of its keys.
///
/// @param <T> what an object is
public final class Documents<T> implements Placed {
  private final Source source;
  private final List<T> all;
  private final List<JsonValue.Fields> fields;

  Documents(Source source, List<T> all, List<JsonFields> fields) {
    this.source = source;
    this.all = List.copyOf(all);
    this.fields = fields.stream().map(JsonFields::fields).toList();
  }

  /// The objects in the file's order.
  public List<T> all() {
    return all;
  }

  @Override
  public List<Problem> problems(List<Fault> faults) {
    return faults.stream()
        .map(f -> new Problem(source.path().toString(), place(f), f.sentence()))
        .sorted(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column))
        .toList();
  }

  private Place place(Fault fault) {
    JsonValue.Fields object = fields.get(fault.row());
    String key = fault.column().isEmpty() ? named(fault.sentence(), object) : fault.column();
    JsonValue.Field field = object.byName().get(key);
    return field == null ? object.place() : field.content().place();
  }

  /// The key that a sentence names first behind the name of what it speaks of.
  private static @Nullable String named(String sentence, JsonValue.Fields object) {
    Map<String, JsonValue.Field> keys = object.byName();
    Matcher words = Pattern.compile("\\w+").matcher(sentence);
    words.region(sentence.indexOf(": ") + 1, sentence.length());
    while (words.find()) {
      if (keys.containsKey(words.group())) {
        return words.group();
      }
    }
    return null;
  }
}
