package lodebook.db.refusal;

import java.text.MessageFormat;
import java.util.List;
import java.util.Locale;
import java.util.ResourceBundle;
import java.util.regex.Pattern;

/// The sentences of one resource bundle in one language.
///
/// `{0}` is the first argument, as text: a number has a point and no groups, whatever the language.
/// `{0|piece|pieces}` is `piece` where the first argument is 1, else `pieces`.
public final class Phrases {
  private static final Pattern FORMS = Pattern.compile("\\{(\\d)\\|([^|}]*)\\|([^|}]*)}");

  private final ResourceBundle bundle;

  /// Sentences in a language; English where there is no translation.
  ///
  /// @param name the bundle's name, such as `lodebook.db.messages`
  public Phrases(String name, Locale locale) {
    bundle =
        ResourceBundle.getBundle(
            name,
            locale,
            ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_PROPERTIES));
  }

  /// The sentence of a key.
  ///
  /// @param arguments what fills its places
  public String say(String key, List<String> arguments) {
    String pattern =
        FORMS
            .matcher(bundle.getString(key))
            .replaceAll(
                form -> {
                  boolean one = arguments.get(Integer.parseInt(form.group(1))).equals("1");
                  return form.group(one ? 2 : 3);
                });
    return new MessageFormat(pattern, Locale.ROOT).format(arguments.toArray());
  }
}
