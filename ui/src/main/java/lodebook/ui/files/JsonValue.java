package lodebook.ui.files;

import java.util.List;
import java.util.Map;

/// A value of a JSON file with the place where it stands.
sealed interface JsonValue {
  /// Where the value begins.
  Place place();

  /// The value as a person would quote it.
  String shown();

  /// An object.
  record Fields(Place place, Map<String, Field> byName) implements JsonValue {
    @Override
    public String shown() {
      return "an object";
    }
  }

  /// One key of an object.
  record Field(Place place, JsonValue content) {}

  /// A list.
  record Items(Place place, List<JsonValue> values) implements JsonValue {
    @Override
    public String shown() {
      return "a list";
    }
  }

  /// A text.
  record Text(Place place, String content) implements JsonValue {
    @Override
    public String shown() {
      return '"' + content + '"';
    }
  }

  /// A number.
  record Amount(Place place, double content, String shown) implements JsonValue {}

  /// True or false.
  record Truth(Place place, boolean content) implements JsonValue {
    @Override
    public String shown() {
      return Boolean.toString(content);
    }
  }

  /// Null.
  record Nothing(Place place) implements JsonValue {
    @Override
    public String shown() {
      return "null";
    }
  }
}
