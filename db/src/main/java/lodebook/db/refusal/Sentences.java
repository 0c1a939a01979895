package lodebook.db.refusal;

import java.text.MessageFormat;
import java.util.Locale;
import java.util.ResourceBundle;

/// Turns notices and refusals into sentences of one language.
public final class Sentences {
  private static final String BUNDLE = "lodebook.db.messages";

  private final ResourceBundle bundle;
  private final Locale locale;

  private Sentences(Locale locale) {
    this.locale = locale;
    this.bundle =
        ResourceBundle.getBundle(
            BUNDLE,
            locale,
            ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_PROPERTIES));
  }

  /// Sentences in a language; English where there is no translation.
  public static Sentences in(Locale locale) {
    return new Sentences(locale);
  }

  /// Sentences in English.
  public static Sentences english() {
    return new Sentences(Locale.ROOT);
  }

  /// The notice in words.
  public String say(Notice notice) {
    return new MessageFormat(bundle.getString(notice.key()), locale)
        .format(notice.arguments().toArray());
  }

  /// The refusal in words, without its remedy.
  public String say(Refusal refusal) {
    return say(refusal.notice());
  }
}
