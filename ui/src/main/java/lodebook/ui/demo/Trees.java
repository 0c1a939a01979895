package lodebook.ui.demo;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import tools.jackson.databind.JsonNode;

/// Reads the trees that `trace` prints.
final class Trees {
  private Trees() {}

  /// Codes of one kind anywhere in the branches of a tree, in their order, each once.
  static List<String> codes(JsonNode branches, String kind) {
    Set<String> codes = new LinkedHashSet<>();
    gather(branches, kind, codes);
    return new ArrayList<>(codes);
  }

  private static void gather(JsonNode branches, String kind, Set<String> codes) {
    for (JsonNode node : branches) {
      if (node.path("kind").asString("").equals(kind)) {
        codes.add(node.get("code").asString());
      }
      gather(node.path("madeFrom"), kind, codes);
      gather(node.path("wentInto"), kind, codes);
    }
  }
}
