package lodebook.db.refusal;

import java.util.Locale;

/// Turns notices and refusals into sentences of one language.
public final class Sentences {
  private static final String BUNDLE = "lodebook.db.messages";

  private final Phrases phrases;

  private Sentences(Locale locale) {
    this.phrases = new Phrases(BUNDLE, locale);
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
    return phrases.say(notice.key(), notice.arguments());
  }

  /// The refusal in words, without its remedy.
  public String say(Refusal refusal) {
    return say(refusal.notice());
  }
}
