package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import lodebook.ui.files.Example;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// Who may do what, command by command and role by role.
class RightsTest {
  private static final Set<String> ALL = Set.of("bench", "inspector", "planner", "lead");
  private static final Set<String> INSPECTION = Set.of("inspector", "lead");
  private static final Set<String> DESIGN = Set.of("planner", "lead");
  private static final Set<String> LEAD = Set.of("lead");
  private static final List<String> ROLES = List.of("bench", "inspector", "planner", "lead");

  @TempDir Path folder;

  private record Right(Set<String> roles, String action, List<String> line) {}

  private static Right right(Set<String> roles, String action, String... line) {
    return new Right(roles, action, List.of(line));
  }

  @Test
  void everyRoleMayDoWhatTheTableSaysAndNothingElse() {
    Shop shop = Day.ready(folder);
    for (String role : ROLES) {
      String name = "--name=" + role;
      shop.does("person", "add", role, name, "--role", role);
      shop.does("rotor", "open", "STIR-IN", "--serial", "R-" + role);
    }
    String place = shop.file("p.csv", "slot,piece,facing_deg\n2,L-2404,270\n");
    String off = shop.file("off.csv", "slot,piece,facing_deg\n1,L-2404,30\n");
    String survey =
        shop.file("s.csv", "slot,spot,component,value,unit\n2,centre,tangential,300,mT\n");
    String moves = shop.file("m.csv", Example.MOVES.text());
    for (Right right :
        List.of(
            right(ALL, "place", "place", "R-#", place),
            right(ALL, "survey import", "survey", "import", "R-#", survey, "--meter", "GM-1"),
            right(ALL, "tray move", "tray", "move", moves),
            right(ALL, "lot hold", "lot", "hold", "L-2407", "--why=x"),
            right(ALL, "piece hold", "piece", "hold", "L-2404/20", "--why=x"),
            right(INSPECTION, "lot accept", "lot", "accept", "L-2407", "--why=x"),
            right(INSPECTION, "lot reject", "lot", "reject", "L-2407", "--why=x"),
            right(INSPECTION, "lot free", "lot", "free", "L-2407", "--why=x"),
            right(INSPECTION, "piece free", "piece", "free", "L-2404/20", "--why=x"),
            right(
                INSPECTION,
                "meter add",
                "meter",
                "add",
                "GM-#",
                "--accuracy-percent=1",
                "--calibration-due=2027-06-30"),
            right(DESIGN, "type import", "type", "import", shop.file("t.csv", type())),
            right(DESIGN, "grade import", "grade", "import", shop.file("g.csv", grade())),
            right(DESIGN, "layout import", "layout", "import", folder + "/layout.json"),
            right(DESIGN, "layout release", "layout", "release", "STIR-IN"),
            right(DESIGN, "gear import", "gear", "import", folder + "/gear.json"),
            right(DESIGN, "gear release", "gear", "release", "STIR"),
            right(DESIGN, "batch open", "batch", "open", "B-#", "--gear=STIR", "--count=1"),
            right(
                DESIGN,
                "unit assemble",
                "unit",
                "assemble",
                "U-#",
                "--gear=STIR",
                "--inner=R-bench",
                "--outer=R-lead"),
            right(LEAD, "place --deviation", "place", "R-#", off, "--deviation", "--why=x"),
            right(
                LEAD,
                "unit assemble --override",
                "unit",
                "assemble",
                "U-#",
                "--gear=STIR",
                "--inner=R-bench",
                "--outer=R-lead",
                "--override",
                "--why=x"),
            right(LEAD, "person add", "person", "add", "N#", "--name=New"),
            right(LEAD, "person role", "person", "role", "bench", "bench"),
            right(LEAD, "person retire", "person", "retire", "nobody"),
            right(LEAD, "book setting", "book", "setting", "shop", "Our shop"),
            right(LEAD, "rotor scrap", "rotor", "scrap", "R-#", "--why=x"))) {
      for (String role : ROLES) {
        check(shop, right, role);
      }
    }
  }

  private static void check(Shop shop, Right right, String role) {
    List<String> words = new ArrayList<>(right.line());
    words.replaceAll(word -> word.replace("#", role));
    words.add("--by=" + role);
    String[] line = words.toArray(String[]::new);
    Shop.Said said = shop.run(line);
    String what = role + ": " + String.join(" ", line);
    boolean allowed = right.roles().contains(role);
    boolean design = right.action().equals("unit assemble --override") && !role.equals("planner");
    if (allowed) {
      assertFalse(said.err().contains(" may not do "), () -> what + "\n" + said);
    } else {
      String action = design ? "unit assemble" : right.action();
      String needs = right.roles().equals(LEAD) && !design ? "lead" : needs(right, design);
      assertEquals(
          new Shop.Said(
              4,
              "",
              "lodebook: "
                  + role
                  + " is "
                  + role
                  + " and may not do \""
                  + action
                  + "\"; it needs "
                  + needs
                  + "\ntry: lodebook person list\n"),
          said,
          what);
    }
  }

  private static String needs(Right right, boolean design) {
    return design || right.roles().equals(DESIGN) ? "planner or lead" : "inspector or lead";
  }

  /// Who built at a rotor may plan the rest of it anew, and only a lead corrects what another
  /// person recorded.
  @Test
  void whatIsOnesOwn() {
    Shop shop = Day.ready(folder);
    shop.does("person", "add", "TB", "--name", "T");
    shop.does("person", "add", "PL", "--name", "P", "--role", "planner");
    shop.does("rotor", "open", "STIR-IN", "--serial", "R-1");
    String[] plan = Day.words("plan R-1 --from L-2404 --seconds 0.1 --by TB --quiet");
    assertEquals(
        """
        lodebook: TB is bench and may not do "plan"; it needs planner or lead
        try: lodebook person list
        """,
        shop.run(plan).err());
    String placements = shop.file("p.csv", "slot,piece,facing_deg\n1,L-2404/1,0\n");
    shop.does("place", "R-1", placements, "--by", "TB");
    assertEquals(0, shop.run(plan).code());
    String[] correct = Day.words("place R-1", placements, "--correct", "--why", "x", "--by");
    Shop.Said other = shop.run(Day.words(String.join(" ", correct), "PL"));
    assertEquals(
        new Shop.Said(
            4,
            "",
            """
            p.csv:2:1: slot 1 of rotor R-1 was recorded by TB; only a lead corrects what another person recorded
            nothing was changed
            try: lodebook person list
            """),
        other);
    assertEquals(0, shop.run(Day.words(String.join(" ", correct), "TB")).code());
    assertEquals(0, shop.run(Day.words(String.join(" ", correct), "AB")).code());
  }

  private static String type() {
    return Example.TYPES.text().replace("BLK", "B");
  }

  private static String grade() {
    return Example.GRADES.text();
  }
}
