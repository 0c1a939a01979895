package lodebook.ui.words;

import java.text.MessageFormat;
import java.util.Arrays;
import java.util.Locale;
import java.util.ResourceBundle;

/// The sentences of the program in one language, from the bundle `lodebook.ui.messages`.
///
/// Arguments go in as text: a number is written as `String.valueOf` has it, with a point and
/// without groups, whatever the language.
public final class Words {
  private static final String BUNDLE = "lodebook.ui.messages";

  private final ResourceBundle bundle;
  private final Locale locale;

  private Words(Locale locale) {
    this.locale = locale;
    this.bundle =
        ResourceBundle.getBundle(
            BUNDLE,
            locale,
            ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_PROPERTIES));
  }

  /// The sentences of a language; English where there is no translation.
  public static Words in(Locale locale) {
    return new Words(locale);
  }

  /// The sentences in English.
  public static Words english() {
    return new Words(Locale.ROOT);
  }

  /// The sentence of a key.
  ///
  /// @param key key in the bundle
  /// @param arguments what fills its places
  public String say(String key, Object... arguments) {
    Object[] texts = Arrays.stream(arguments).map(String::valueOf).toArray();
    return new MessageFormat(bundle.getString(key), locale).format(texts);
  }

  /// The language.
  public Locale locale() {
    return locale;
  }
}
