package lodebook.ui.desk.words;

import java.text.MessageFormat;
import java.text.NumberFormat;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.time.format.FormatStyle;
import java.util.Locale;
import java.util.ResourceBundle;

/// The desktop's sentences in one language, from the bundle `lodebook.ui.desk.words.desk`; numbers,
/// dates and times as that language has them.
public final class DeskWords {
  /// Name of the bundle.
  static final String BUNDLE = "lodebook.ui.desk.words.desk";

  private static final String MINUS = "\u2212";

  private final ResourceBundle bundle;
  private final Locale locale;
  private final ZoneId zone;

  /// @param locale the language; English where there is no translation
  /// @param zone the station's zone
  public DeskWords(Locale locale, ZoneId zone) {
    this.locale = locale.equals(Locale.ROOT) ? Locale.ENGLISH : locale;
    this.zone = zone;
    this.bundle =
        ResourceBundle.getBundle(
            BUNDLE,
            this.locale,
            ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_PROPERTIES));
  }

  /// The language.
  public Locale locale() {
    return locale;
  }

  /// The sentence of a key; arguments go in as texts.
  public String say(String key, Object... arguments) {
    Object[] texts = new Object[arguments.length];
    for (int i = 0; i < arguments.length; i++) {
      texts[i] = String.valueOf(arguments[i]);
    }
    return new MessageFormat(bundle.getString(key), locale).format(texts);
  }

  /// A whole number.
  public String number(long number) {
    return NumberFormat.getIntegerInstance(locale).format(number);
  }

  /// A number with a fixed count of decimals.
  public String number(double number, int decimals) {
    NumberFormat format = NumberFormat.getNumberInstance(locale);
    format.setMinimumFractionDigits(decimals);
    format.setMaximumFractionDigits(decimals);
    String text = format.format(number);
    boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
    String unsigned = text.replace("-", "").replace(MINUS, "");
    return number < 0 && !zero ? MINUS + unsigned : unsigned;
  }

  /// Flux density in mT, without the unit.
  public String milliTesla(double tesla) {
    return number(tesla * 1e3, 1);
  }

  /// A share in per cent, without the sign.
  public String percent(double share, int decimals) {
    return number(share * 100, decimals);
  }

  /// A time to the minute.
  public String minute(Instant time) {
    return DateTimeFormatter.ofLocalizedDateTime(FormatStyle.SHORT)
        .withLocale(locale)
        .format(time.atZone(zone));
  }

  /// A day.
  public String day(LocalDate day) {
    return DateTimeFormatter.ofLocalizedDate(FormatStyle.MEDIUM).withLocale(locale).format(day);
  }

  /// The day of a time at this station.
  public LocalDate dayOf(Instant time) {
    return time.atZone(zone).toLocalDate();
  }
}
