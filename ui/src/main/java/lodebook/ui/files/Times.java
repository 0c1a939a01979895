package lodebook.ui.files;

import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.time.ZonedDateTime;
import java.time.format.DateTimeFormatter;
import java.time.temporal.TemporalAccessor;

/// Times as people write them.
public final class Times {

  private Times() {}

  /// An ISO 8601 day or time; a day is its first moment, a time without an offset is the station's.
  ///
  /// @throws java.time.format.DateTimeParseException where the text is neither
  public static Instant parse(String text, ZoneId zone) {
    if (text.length() == 10) {
      return LocalDate.parse(text).atStartOfDay(zone).toInstant();
    }
    String iso = text.length() > 10 && text.charAt(10) == ' ' ? text.replaceFirst(" ", "T") : text;
    TemporalAccessor time =
        DateTimeFormatter.ISO_DATE_TIME.parseBest(
            iso, ZonedDateTime::from, OffsetDateTime::from, LocalDateTime::from);
    return switch (time) {
      case ZonedDateTime zoned -> zoned.toInstant();
      case OffsetDateTime offset -> offset.toInstant();
      default -> LocalDateTime.from(time).atZone(zone).toInstant();
    };
  }
}
