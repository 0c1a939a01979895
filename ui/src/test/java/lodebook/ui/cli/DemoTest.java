package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// The demo walks the whole job and leaves what it promises.
class DemoTest {
  @TempDir Path folder;

  @Test
  void theDemoFindsTheReversedMagnetAndTheOtherGear() throws IOException {
    Shop shop = new Shop(folder).with("LODEBOOK_BY", "nobody").with("LODEBOOK_BOOK", "elsewhere");
    Path into = folder.resolve("demo");
    List<String> lines = shop.does("demo", "--into", into.toString()).lines().toList();

    assertEquals(20, lines.stream().filter(line -> line.matches("[ 0-9][0-9]\\. .*")).count());
    assertTrue(
        lines.contains("14. The survey finds it: slot 8 is reversed (probability 1.0000)."),
        () -> String.join("\n", lines));
    assertTrue(
        lines.contains("20. Lot L-2404 is also in U-102: stop it."),
        () -> String.join("\n", lines));
    assertEquals("demo", lines.getLast());
    for (String left :
        List.of(
            "book/book.mv.db",
            "files/types.csv",
            "papers/traveller-B-31-0001.pdf",
            "papers/traveller-B-31-0004.pdf",
            "pictures/STIR-OUT.png")) {
      assertTrue(Files.size(into.resolve(left)) > 0, left);
    }
    shop.with("LODEBOOK_BOOK", into.resolve("book").toString());
    assertTrue(shop.does("book", "verify").startsWith("the book is whole: "));
  }

  @Test
  void aFolderThatHoldsSomethingIsRefused() throws IOException {
    Files.writeString(Files.createDirectory(folder.resolve("full")).resolve("a"), "a");
    Shop.Said said = new Shop(folder).run("demo", "--into", folder.resolve("full").toString());
    assertEquals(4, said.code());
    assertEquals(
        """
        lodebook: the folder full is not empty; the demo needs a new or empty folder
        try: lodebook demo --into NEW-FOLDER
        """,
        said.err());
  }
}
