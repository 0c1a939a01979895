package lodebook.ui.cli;

import java.util.Map;
import java.util.TreeMap;
import lodebook.db.keep.Settings;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Shows or settles something for the whole book.
@Command(
    name = "setting",
    description = {
      "Show or settle something for the whole book: name, shop, and how likely faults and slips",
      "are before the first reading of a survey, each a probability per magnet, reading or survey:",
      "prior-reversed (0.02), prior-further-reversed (0.1), prior-quarter-turn (0.002),",
      "prior-turned (0.002), prior-missing (0.001), prior-weak (0.004), prior-strong (0.00003),",
      "prior-wild-reading (0.0015), prior-sign-inverted (0.05), prior-other-start (0.01),",
      "prior-opposite (0.02), prior-unit-slip (0.02), prior-whole-ring (0.005)."
    },
    footer = {
      "",
      "Example:",
      "  lodebook book setting shop \"Workshop by the river\"",
      "  lodebook book setting prior-missing 0.005"
    })
final class BookSetting extends Verb {
  @Parameters(index = "0", arity = "0..1", paramLabel = "NAME", description = "what")
  private @Nullable String name;

  @Parameters(index = "1", arity = "0..1", paramLabel = "VALUE", description = "its new value")
  private @Nullable String content;

  BookSetting(Session session) {
    super(session);
  }

  @Override
  int run() {
    String which = name;
    String settled = content;
    if (which == null) {
      Map<String, String> all = session.read(book -> new Settings(book).all());
      Table table = new Table("SETTING", "VALUE");
      Json document = Json.object();
      new TreeMap<>(all).forEach((key, value) -> document.put(key, value));
      new TreeMap<>(all).forEach(table::row);
      session.list(document, table, "setting.none");
    } else if (settled == null) {
      String value = session.read(book -> new Settings(book).get(which));
      if (!session.json(Json.object().put(which, value))) {
        session.say(value);
      }
    } else {
      session.change(book -> new Settings(book).set(session.act(), which, settled));
      session.done("setting.set", which, settled);
      session.next("lodebook book setting");
    }
    return 0;
  }
}
