package lodebook.reports.words;

import java.text.MessageFormat;
import java.util.Locale;
import java.util.MissingResourceException;
import java.util.ResourceBundle;

/// The sheets' words in one language: English, or German.
public final class Words {
  private final ResourceBundle bundle;
  private final Locale language;

  /// The words of a language; English where there is no translation.
  public Words(Locale language) {
    this.bundle =
        ResourceBundle.getBundle(
            "lodebook.reports.words.sheets",
            language,
            ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_PROPERTIES));
    this.language =
        bundle.getLocale().getLanguage().isEmpty() ? Locale.ENGLISH : bundle.getLocale();
  }

  /// The language in which these words are.
  public Locale language() {
    return language;
  }

  /// The words of a key with values put in; a text is put in as it is.
  ///
  /// @throws MissingResourceException if no sheet has such a key
  public String say(String key, Object... values) {
    return new MessageFormat(bundle.getString(key), language).format(values);
  }

  /// A number with a fixed count of decimals, with the sign of minus as printers set it.
  public String number(double value, int decimals) {
    String text = String.format(language, "%." + decimals + "f", value);
    boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
    if (zero) {
      return text.replace("-", "");
    }
    return text.replace('-', '\u2212');
  }

  /// A number as [#number] has it, with its sign also where it is positive.
  public String signed(double value, int decimals) {
    String text = number(value, decimals);
    boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
    return value > 0 && !zero ? "+" + text : text;
  }

  /// A number with at most so many decimals, without zeros at its end.
  public String trimmed(double value, int mostDecimals) {
    int decimals = mostDecimals;
    while (decimals > 0 && Math.abs(value - rounded(value, decimals - 1)) < 1e-9) {
      decimals--;
    }
    return number(value, decimals);
  }

  private static double rounded(double value, int decimals) {
    double power = Math.pow(10, decimals);
    return Math.rint(value * power) / power;
  }
}
