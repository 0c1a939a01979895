package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import picocli.CommandLine;

/// The form of command lines: what is wrong with them, help, where the book is, what fails.
class CommandLineTest {
  @TempDir Path folder;

  @Test
  void bareNameShowsTheHelpAndIsWrong() {
    Shop.Said said = new Shop(folder).run();
    assertEquals(2, said.code());
    assertEquals("", said.err());
    assertEquals(new Shop(folder).does("help"), said.out());
    assertTrue(said.out().contains("Receive lots of magnets"), said.out());
  }

  @Test
  void everyLineOfHelpFitsATerminalAndEveryCommandHasAnExample() {
    Shop shop = new Shop(folder);
    List<String> pages = new ArrayList<>(List.of(shop.does("help")));
    int commands = 0;
    for (CommandLine noun : Commands.whole(session()).getSubcommands().values()) {
      if (noun.getSubcommands().isEmpty()) {
        pages.add(example(shop, noun.getCommandName()));
        commands++;
      }
      for (CommandLine verb : noun.getSubcommands().values()) {
        pages.add(example(shop, noun.getCommandName(), verb.getCommandName()));
        commands++;
      }
    }
    assertTrue(commands > 30, commands + " commands were seen");
    for (String page : pages) {
      page.lines().forEach(line -> assertTrue(line.length() <= 80, line));
    }
  }

  private static String example(Shop shop, String... command) {
    String[] line = new String[command.length + 1];
    line[0] = "help";
    System.arraycopy(command, 0, line, 1, command.length);
    String page = shop.does(line);
    String name = String.join(" ", command);
    assertTrue(
        page.contains("\nExample:\n  lodebook " + name) || page.contains("<(lodebook completion)"),
        () -> name + " has no example: " + page);
    return page;
  }

  private Session session() {
    return new Session(new Surroundings(Map.of(), System.out, System.err, Clock.systemUTC()));
  }

  @Test
  void wrongLines() {
    wrong(
        "lodebook: there is no command lto\ndid you mean: lodebook lot\ntry: lodebook help\n",
        "lto");
    wrong(
        "lodebook: there is no command shwo\ndid you mean: lodebook lot show\ntry: lodebook help lot\n",
        "lot",
        "shwo");
    wrong(
        "lodebook: there is no option --jsn\ndid you mean: --json\ntry: lodebook help lot list\n",
        "lot",
        "list",
        "--jsn");
    wrong("lodebook: FILE is missing\ntry: lodebook help lot import\n", "lot", "import");
    wrong(
        "lodebook: --name NAME, INITIALS are missing\ntry: lodebook help person add\n",
        "person",
        "add");
    wrong(
        "lodebook: --name stands twice\ntry: lodebook help person add\n",
        "person",
        "add",
        "X",
        "--name=X",
        "--name=Y");
    wrong(
        """
        lodebook: --role is boss, expected one of bench, inspector, planner, lead
        try: lodebook help person add
        """,
        "person",
        "add",
        "X",
        "--name",
        "X",
        "--role",
        "boss");
  }

  private void wrong(String expected, String... line) {
    Shop.Said said = new Shop(folder).run(line);
    assertEquals(new Shop.Said(2, "", expected), said);
  }

  @Test
  void bareNounShowsItsVerbs() {
    Shop.Said said = new Shop(folder).run("tray");
    assertEquals(2, said.code());
    assertTrue(said.err().contains("  unsure  Say that nobody knows"), said.err());
  }

  @Test
  void noBook() {
    assertEquals(
        new Shop.Said(
            5,
            "",
            "lodebook: there is no book at lodebook/book\ntry: lodebook book create --book lodebook/book\n"),
        new Shop(folder).run("lot", "list"));
  }

  @Test
  void otherBookIsNamedAfterWriting() {
    Shop shop = new Shop(folder);
    String other = folder.resolve("other").toString();
    assertEquals(0, shop.run("book", "create", "--book", other).code());
    Shop.Said said = shop.run("person", "add", "AB", "--name", "A. Baker", "--book", other);
    assertEquals(
        """
        book: other
        next: lodebook meter add METER --accuracy-percent 1 --calibration-due 2027-06-30
        """,
        said.err());
    shop.with("LODEBOOK_BOOK", other);
    assertEquals("", shop.run("person", "list").err());
    assertEquals("", shop.run("person", "add", "CD", "--name", "C", "--by", "AB", "--quiet").err());
  }

  @Test
  void jsonIsOneDocumentOnStandardOutput() {
    Shop shop = Shop.open(folder);
    assertEquals(
        "[{\"initials\":\"AB\",\"name\":\"A. Baker\",\"role\":\"lead\",\"retired\":false}]\n",
        shop.does("--json", "person", "list"));
    assertEquals(
        new Shop.Said(0, "{\"done\":\"CD (C) signs from now on as planner\"}\n", ""),
        shop.run("person", "add", "CD", "--name", "C", "--role", "planner", "--json"));
  }

  @Test
  void whoMayNot() {
    Shop shop = Shop.open(folder);
    shop.does("person", "add", "CD", "--name", "C");
    Shop.Said said = shop.run("person", "add", "EF", "--name", "E", "--by", "CD");
    assertEquals(
        new Shop.Said(
            4,
            "",
            """
            lodebook: CD is bench and may not do "person add"; it needs lead
            try: lodebook person list
            """),
        said);
    assertEquals(
        "lodebook: nobody here signs as zz\ntry: lodebook person list\n",
        shop.run("person", "retire", "CD", "--by", "zz").err());
  }

  @Test
  void defectHasACodeAndALog() throws IOException {
    Clock broken =
        new Clock() {
          @Override
          public ZoneId getZone() {
            return ZoneOffset.UTC;
          }

          @Override
          public Clock withZone(ZoneId zone) {
            return this;
          }

          @Override
          public Instant instant() {
            if (StackWalker.getInstance()
                .walk(s -> s.anyMatch(f -> f.getMethodName().equals("defect")))) {
              return Instant.EPOCH;
            }
            throw new IllegalStateException("the clock fell off the wall");
          }
        };
    Shop shop = Shop.open(folder).at(broken);
    Shop.Said said = shop.run("person", "add", "CD", "--name", "C");
    assertEquals(70, said.code());
    assertEquals("", said.out());
    assertTrue(
        said.err()
            .matches(
                "lodebook: sorry, this is a defect of the program, not your mistake; the book is as"
                    + " before. Code D-[0-9A-F]{6}, details in lodebook/defects.log\n"),
        said.err());
    String log = Files.readString(folder.resolve("lodebook/defects.log"));
    assertTrue(log.startsWith("1970-01-01T00:00:00Z D-"), log);
    assertTrue(log.contains(" person add\njava.lang.IllegalStateException: the clock fell"), log);
  }

  @Test
  void historyOfAnUnknownNumberIsRefused() {
    Shop.Said said = Shop.open(folder).run("history", "NO-1", "--json");
    assertEquals(4, said.code());
    assertEquals("", said.out());
    assertEquals(
        "lodebook: no line of the history speaks of NO-1\ntry: lodebook history\n", said.err());
  }

  @Test
  void completionNamesCommands() {
    String script = new Shop(folder).does("completion");
    assertTrue(script.contains("_picocli_lodebook_lot_import"), "no function for lot import");
  }
}
