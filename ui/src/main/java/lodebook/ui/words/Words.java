package lodebook.ui.words;

import java.util.Arrays;
import java.util.Locale;
import lodebook.db.refusal.Phrases;

/// The sentences of the program in one language, from the bundle `lodebook.ui.messages`.
///
/// Arguments go in as text, as `String.valueOf` has it; see [Phrases] for plural forms.
public final class Words {
  private static final String BUNDLE = "lodebook.ui.messages";

  private final Phrases phrases;
  private final Locale locale;

  private Words(Locale locale) {
    this.locale = locale;
    this.phrases = new Phrases(BUNDLE, locale);
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
    return phrases.say(key, Arrays.stream(arguments).map(String::valueOf).toList());
  }

  /// The language.
  public Locale locale() {
    return locale;
  }
}
