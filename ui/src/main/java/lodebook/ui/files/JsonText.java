package lodebook.ui.files;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.TokenStreamLocation;
import tools.jackson.core.exc.JacksonIOException;
import tools.jackson.core.exc.StreamReadException;
import tools.jackson.core.json.JsonFactory;

/// Reads a JSON file (RFC 8259) into values that know their place.
final class JsonText {
  private final JsonParser parser;
  private final JsonProblems problems;

  private JsonText(JsonParser parser, JsonProblems problems) {
    this.parser = parser;
    this.problems = problems;
  }

  /// The value of a whole file; a key that stands twice is noted as a problem.
  ///
  /// @throws BadFile where the file is no JSON
  static JsonValue read(Source source, JsonProblems problems) {
    try (BufferedReader reader = TextFile.open(source);
        JsonParser parser = new JsonFactory().createParser(ObjectReadContext.empty(), reader)) {
      if (parser.nextToken() == null) {
        throw source.bad(Place.START, "file.empty");
      }
      JsonValue whole = new JsonText(parser, problems).current();
      if (parser.nextToken() != null) {
        throw source.bad(
            place(parser.currentTokenLocation()), "json.broken", "text follows its end");
      }
      return whole;
    } catch (StreamReadException broken) {
      throw source.bad(place(broken.getLocation()), "json.broken", firstLine(broken));
    } catch (JacksonIOException failed) {
      throw failed.getCause() instanceof CharacterCodingException
          ? TextFile.notUtf8(source)
          : source.bad(Place.START, "file.unreadable", failed);
    } catch (IOException unreadable) {
      throw source.bad(Place.START, "file.unreadable", unreadable);
    }
  }

  private static String firstLine(StreamReadException broken) {
    String message = broken.getOriginalMessage();
    int end = message.indexOf('\n');
    return end < 0 ? message : message.substring(0, end);
  }

  private JsonValue current() {
    Place place = place(parser.currentTokenLocation());
    JsonToken token = parser.currentToken();
    return switch (token) {
      case START_OBJECT -> fields(place);
      case START_ARRAY -> items(place);
      case VALUE_STRING -> new JsonValue.Text(place, parser.getString());
      case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT ->
          new JsonValue.Amount(place, Double.parseDouble(parser.getString()), parser.getString());
      case VALUE_TRUE -> new JsonValue.Truth(place, true);
      case VALUE_FALSE -> new JsonValue.Truth(place, false);
      default -> new JsonValue.Nothing(place);
    };
  }

  private JsonValue fields(Place place) {
    Map<String, JsonValue.Field> fields = new LinkedHashMap<>();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      Place keyPlace = place(parser.currentTokenLocation());
      String key = parser.currentName();
      parser.nextToken();
      JsonValue value = current();
      if (fields.putIfAbsent(key, new JsonValue.Field(keyPlace, value)) != null) {
        problems.note(keyPlace, "json.twice", key);
      }
    }
    return new JsonValue.Fields(place, fields);
  }

  private JsonValue items(Place place) {
    List<JsonValue> values = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      values.add(current());
    }
    return new JsonValue.Items(place, values);
  }

  private static Place place(TokenStreamLocation location) {
    return new Place(Math.max(1, location.getLineNr()), Math.max(1, location.getColumnNr()));
  }
}
