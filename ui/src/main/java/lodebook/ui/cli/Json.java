package lodebook.ui.cli;

import java.io.StringWriter;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.ObjectWriteContext;
import tools.jackson.core.json.JsonFactory;

/// A JSON document being made: an object with its keys in the order in which they are put, or a
/// list. Numbers are rounded to twelve digits; infinite ones and NaN are null.
final class Json {
  private static final MathContext DIGITS = new MathContext(12);

  private final @Nullable Map<String, @Nullable Object> fields;
  private final @Nullable List<@Nullable Object> items;

  private Json(
      @Nullable Map<String, @Nullable Object> fields, @Nullable List<@Nullable Object> items) {
    this.fields = fields;
    this.items = items;
  }

  /// An empty object.
  static Json object() {
    return new Json(new LinkedHashMap<>(), null);
  }

  /// A list of documents, texts or numbers.
  static Json list(List<?> items) {
    return new Json(null, new ArrayList<>(items));
  }

  /// Adds a key; the value is a document, a text, a number, true, false, null or a list of these.
  Json put(String key, @Nullable Object content) {
    if (fields == null) {
      throw new IllegalStateException("a list has no keys");
    }
    fields.put(key, content);
    return this;
  }

  /// Adds a key unless its value is null.
  Json putIfAny(String key, @Nullable Object content) {
    return content == null ? this : put(key, content);
  }

  /// The whole document in one line.
  String text() {
    StringWriter text = new StringWriter();
    try (JsonGenerator generator =
        new JsonFactory().createGenerator(ObjectWriteContext.empty(), text)) {
      write(generator, this);
    }
    return text.toString();
  }

  private static void write(JsonGenerator to, @Nullable Object content) {
    switch (content) {
      case null -> to.writeNull();
      case Json json when json.fields != null -> {
        to.writeStartObject();
        json.fields.forEach(
            (key, inner) -> {
              to.writeName(key);
              write(to, inner);
            });
        to.writeEndObject();
      }
      case Json json when json.items != null -> write(to, json.items);
      case List<?> list -> {
        to.writeStartArray();
        list.forEach(inner -> write(to, inner));
        to.writeEndArray();
      }
      case Boolean truth -> to.writeBoolean(truth);
      case Integer number -> to.writeNumber(number);
      case Long number -> to.writeNumber(number);
      case Double number -> number(to, number);
      default -> to.writeString(content.toString());
    }
  }

  private static void number(JsonGenerator to, double number) {
    if (Double.isFinite(number)) {
      to.writeNumber(new BigDecimal(number).round(DIGITS).doubleValue());
    } else {
      to.writeNull();
    }
  }
}
