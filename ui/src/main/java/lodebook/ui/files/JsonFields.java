package lodebook.ui.files;

import java.util.List;
import java.util.Map;
import java.util.function.DoublePredicate;
import java.util.function.Predicate;
import lodebook.ui.words.Nearest;
import org.jspecify.annotations.Nullable;

/// The keys of one JSON object, read as what they should be.
///
/// What is wrong is noted with its place and a stand-in is returned; a key that nobody knows is
/// noted when the object is opened, with the nearest known key.
final class JsonFields {
  private final JsonProblems problems;
  private final JsonValue.Fields fields;

  private JsonFields(JsonProblems problems, JsonValue.Fields fields) {
    this.problems = problems;
    this.fields = fields;
  }

  /// Opens a value that must be an object.
  ///
  /// @param name how it is called in a sentence
  /// @param known the keys that it may have, in the contract's order
  static JsonFields of(JsonProblems problems, JsonValue value, String name, List<String> known) {
    if (!(value instanceof JsonValue.Fields fields)) {
      problems.note(value.place(), "json.not-object", name, value.shown());
      problems.throwIfAny();
      throw new IllegalStateException("a problem was noted");
    }
    fields
        .byName()
        .forEach(
            (key, field) -> {
              if (!known.contains(key)) {
                unknown(problems, key, field, known);
              }
            });
    return new JsonFields(problems, fields);
  }

  private static void unknown(
      JsonProblems problems, String key, JsonValue.Field field, List<String> known) {
    String nearest = Nearest.to(key, known);
    if (nearest == null) {
      problems.note(field.place(), "json.unknown", key, String.join(", ", known));
    } else {
      problems.note(field.place(), "json.unknown-nearest", key, nearest);
    }
  }

  /// The object itself.
  JsonValue.Fields fields() {
    return fields;
  }

  /// Whether the key is there and not null.
  boolean has(String key) {
    JsonValue.Field field = fields.byName().get(key);
    return field != null && !(field.content() instanceof JsonValue.Nothing);
  }

  /// Notes a problem with a key's value.
  void problem(String key, String sentenceKey, Object... arguments) {
    JsonValue.Field field = fields.byName().get(key);
    Place place = field == null ? fields.place() : field.content().place();
    problems.note(place, sentenceKey, arguments);
  }

  private @Nullable JsonValue value(String key, String expectedKey, Object... arguments) {
    JsonValue.Field field = fields.byName().get(key);
    if (field == null) {
      problems.note(fields.place(), "json.missing", key, problems.say(expectedKey, arguments));
      return null;
    }
    return field.content();
  }

  /// A text that must be there and pass.
  String text(String key, Predicate<String> passes, String expectedKey) {
    JsonValue value = value(key, expectedKey);
    if (value == null) {
      return "";
    }
    if (!(value instanceof JsonValue.Text text)) {
      problems.note(value.place(), "json.not-text", key, value.shown());
      return "";
    }
    if (!passes.test(text.content())) {
      problems.note(value.place(), "json.not-in", key, value.shown(), problems.say(expectedKey));
    }
    return text.content();
  }

  /// A number that must be there and pass; NaN as stand-in.
  double number(String key, DoublePredicate passes, String expectedKey) {
    JsonValue value = value(key, expectedKey);
    if (value == null) {
      return Double.NaN;
    }
    if (!(value instanceof JsonValue.Amount amount) || !Double.isFinite(amount.content())) {
      problems.note(value.place(), "json.not-number", key, value.shown());
      return Double.NaN;
    }
    if (!passes.test(amount.content())) {
      problems.note(value.place(), "json.not-in", key, value.shown(), problems.say(expectedKey));
      return Double.NaN;
    }
    return amount.content();
  }

  /// A number that may be missing or null.
  double numberOr(String key, DoublePredicate passes, String expectedKey, double otherwise) {
    return has(key) ? number(key, passes, expectedKey) : otherwise;
  }

  /// A whole number that must be there and pass; 1 as stand-in.
  int whole(String key, DoublePredicate passes, String expectedKey) {
    double number = number(key, passes, expectedKey);
    if (!Double.isNaN(number) && (number != Math.rint(number) || Math.abs(number) > 1e9)) {
      problem(key, "json.not-whole", key, shown(key));
      return 1;
    }
    return Double.isNaN(number) ? 1 : (int) number;
  }

  /// True or false, that must be there.
  boolean truth(String key) {
    JsonValue value = value(key, "json.truth");
    if (value == null) {
      return false;
    }
    if (!(value instanceof JsonValue.Truth truth)) {
      problems.note(value.place(), "json.not-truth", key, value.shown());
      return false;
    }
    return truth.content();
  }

  /// One of some words that must be there.
  <T> T oneOf(String key, Map<String, T> meanings, T otherwise) {
    String words = String.join(", ", meanings.keySet());
    JsonValue value = value(key, "json.one-of", words);
    return value == null ? otherwise : meaning(key, value, meanings, otherwise);
  }

  private <T> T meaning(String key, JsonValue value, Map<String, T> meanings, T otherwise) {
    T meaning = value instanceof JsonValue.Text text ? meanings.get(text.content()) : null;
    if (meaning != null) {
      return meaning;
    }
    String words = String.join(", ", meanings.keySet());
    String nearest =
        value instanceof JsonValue.Text text ? Nearest.to(text.content(), meanings.keySet()) : null;
    if (nearest == null) {
      problems.note(value.place(), "json.not-word", key, value.shown(), words);
    } else {
      problems.note(value.place(), "json.not-word-nearest", key, value.shown(), words, nearest);
    }
    return otherwise;
  }

  /// A list of words, at least one, each once.
  <T> List<T> listOf(String key, Map<String, T> meanings, T otherwise) {
    JsonValue value = value(key, "json.list");
    if (value == null) {
      return List.of(otherwise);
    }
    if (!(value instanceof JsonValue.Items items)) {
      problems.note(value.place(), "json.not-list", key, value.shown());
      return List.of(otherwise);
    }
    List<T> all = items.values().stream().map(v -> meaning(key, v, meanings, otherwise)).toList();
    if (all.isEmpty()) {
      problems.note(value.place(), "json.not-in", key, "[]", problems.say("json.not-empty"));
    } else if (all.stream().distinct().count() < all.size()) {
      problems.note(value.place(), "json.not-in", key, value.shown(), problems.say("json.once"));
    }
    return all;
  }

  /// An object that must be there; null as stand-in.
  @Nullable JsonFields object(String key, List<String> known) {
    JsonValue value = value(key, "json.object");
    if (value == null) {
      return null;
    }
    if (!(value instanceof JsonValue.Fields)) {
      problems.note(value.place(), "json.not-object", key, value.shown());
      return null;
    }
    return of(problems, value, key, known);
  }

  /// A list of objects that may be missing.
  List<JsonFields> objects(String key, List<String> known) {
    JsonValue value = has(key) ? value(key, "json.list") : null;
    if (value == null) {
      return List.of();
    }
    if (!(value instanceof JsonValue.Items items)) {
      problems.note(value.place(), "json.not-list", key, value.shown());
      return List.of();
    }
    return items.values().stream().map(v -> of(problems, v, key, known)).toList();
  }

  /// The key's value as written.
  String shown(String key) {
    JsonValue.Field field = fields.byName().get(key);
    return field == null ? "" : field.content().shown();
  }

  /// A sentence of the bundle.
  String say(String key, Object... arguments) {
    return problems.say(key, arguments);
  }
}
