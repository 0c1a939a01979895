package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// Batches, rotors, units and traces as a person types them.
class GearsByCommandTest {
  @TempDir Path folder;

  @SuppressWarnings("NullAway.Init")
  private Shop shop;

  @BeforeEach
  void open() {
    shop = Day.ready(folder);
  }

  private void refused(String sentence, String remedy, String line, String... more) {
    assertEquals(
        new Shop.Said(4, "", "lodebook: " + sentence + "\ntry: lodebook " + remedy + "\n"),
        shop.run(Day.words(line, more)));
  }

  @Test
  void batchesAndTheTravellersOfTheirRotorsInOneFile() {
    assertEquals(
        new Shop.Said(
            0,
            "batch B-1 of 1 gear is open, its rotors are B-1-0001, B-1-0002\n",
            "next: lodebook plan --batch B-1 --from LOT\n"),
        shop.run(Day.words("batch open B-1 --gear stir --count 1")));
    assertEquals(
        "batch B-2 of 2 gears is open, its rotors are X-001, X-002, X-003, X-004\n",
        shop.does(Day.words("batch open B-2 --gear STIR@A --count 2 --serials X-{001}")));
    assertEquals(
        """
        BATCH  GEAR    GEARS  ROTORS  FULL  OPENED
        B-1    STIR@A      1       2     0  2026-11-02 08:00
        B-2    STIR@A      2       4     0  2026-11-02 08:00
        """,
        shop.does("batch", "list"));
    assertEquals(
        """
        BATCH    B-1
        gear     STIR@A
        gears    1
        serials  B-1-{0001}
        opened   2026-11-02 08:00
        ROTOR     GEAR  RING   STATE  FILLED  PLAN  SURVEY  UNIT
        B-1-0001     1  inner  open     0/12  -     -       -
        B-1-0002     1  outer  open     0/16  -     -       -
        """,
        shop.does("batch", "show", "b-1"));
    refused(
        "B-1 is taken already: it is a batch", "trace B-1", "batch open b-1 --gear STIR --count 1");
    refused("no open rotor of batch B-1 has a plan", "batch show B-1", "plan --batch B-1 --drop");
    shop.does("place", "B-1-0001", shop.file("i.csv", Day.ring("L-2404", 12, -90)));
    shop.does("place", "B-1-0002", shop.file("o.csv", Day.ring("L-2407", 16, 90)));
    refused(
        "no open rotor of batch B-1 has an empty slot",
        "batch show B-1",
        "plan --batch B-1 --from L-2404");
    refused("there is no batch B-9", "batch list", "batch show B-9");
    assertEquals(
        new Shop.Said(
            3,
            "",
            """
            lodebook: batch B-3 of 0 gears: 1 to 1000 are possible
            try: lodebook help batch open
            """),
        shop.run(Day.words("batch open B-3 --gear STIR --count 0")));
    refused(
        "32 magnets of type BLK-5-5-10 too few: 32 are needed, 0 may be used",
        "lot list",
        "plan --batch B-2 --from L-2404");
    assertEquals(
        new Shop.Said(
            0,
            "the travellers of B-1-0002, B-1-0001 are in t.pdf\n",
            "next: lodebook place B-1-0002 placements.csv\n"),
        shop.run(
            Day.words("paper traveller b-1-0002 B-1-0001 -o", folder.resolve("t.pdf").toString())));
    refused(
        "there is no rotor R-9",
        "rotor list",
        "paper traveller B-1-0001 R-9 -o",
        folder.resolve("no.pdf").toString());
    assertTrue(Files.notExists(folder.resolve("no.pdf")), "no.pdf was written");
  }

  @Test
  void aUnitOfUnmeasuredRotorsComesBackAndIsTraced() {
    shop.does(Day.words("rotor open STIR-IN --serial R-1"));
    shop.does(Day.words("rotor open STIR-OUT --serial R-2"));
    String unit = "unit assemble U-1 --gear STIR --inner R-1 --outer R-2";
    refused("rotor R-1 has magnets in 0 of its 12 slots only", "rotor show R-1", unit);
    shop.does("place", "R-1", shop.file("i.csv", Day.ring("L-2404", 12, -90)));
    shop.does("place", "R-2", shop.file("o.csv", Day.ring("L-2407", 16, 90)));
    refused("rotor R-1 was never surveyed", "survey import R-1 survey.csv --meter METER", unit);
    refused(
        "rotor R-2 is built to STIR-OUT@A; the inner rotor of STIR@A is built to STIR-IN@A",
        "rotor list",
        "unit assemble U-1 --gear STIR --inner R-2 --outer R-1");
    assertEquals(
        new Shop.Said(2, "", "lodebook: --why TEXT is missing\ntry: lodebook help unit assemble\n"),
        shop.run(Day.words(unit, "--override")));
    assertEquals(
        "unit U-1 is assembled to STIR@A\n",
        shop.does(Day.words(unit, "--override", "--why", "a trial")));
    refused("rotor R-2 is in unit U-1", "unit show U-1", "rotor scrap R-2 --why", "dropped");
    refused(
        "rotor R-1 is in unit U-1",
        "unit show U-1",
        "unit assemble U-2 --gear STIR --inner R-1 --outer R-2 --override --why x");
    assertEquals(
        """
        UNIT   U-1, assembled
        gear   STIR@A
        batch  -
        MEMBER  POSITION  FROM              TO  WHY
        R-1     inner     2026-11-02 08:00  -   a trial
        R-2     outer     2026-11-02 08:00  -   a trial
        WHEN              BY  STATE      WHY
        2026-11-02 08:00  AB  assembled
        """,
        shop.does("unit", "show", "U-1"));
    assertEquals(
        new Shop.Said(
            2,
            "",
            "lodebook: --complaint says nothing: give a reason\ntry: lodebook help unit return\n"),
        shop.run("unit", "return", "U-1", "--complaint", " "));
    assertEquals("unit U-1 came back\n", shop.does(Day.words("unit return U-1 --complaint slips")));
    refused("unit U-1 is returned already", "unit show U-1", "unit return U-1 --complaint again");
    assertEquals(
        """
        U-1 (unit, returned)
        made from
          R-1 (rotor, open) 2026-11-02 08:00
            L-2404 (lot, accepted), 12 magnets 2026-11-02 08:00
              FH-88107 (supplier lot)
          R-2 (rotor, open) 2026-11-02 08:00
            L-2407 (lot, accepted), 16 magnets 2026-11-02 08:00
              FH-88112 (supplier lot)
        """,
        shop.does("trace", "u-1"));
    assertEquals(
        """
        L-2407 (lot, accepted)
        made from
          FH-88112 (supplier lot)
        went into
          R-2 (rotor, open), 16 magnets 2026-11-02 08:00
            U-1 (unit, returned) 2026-11-02 08:00
        """,
        shop.does("trace", "L-2407"));
    String json = shop.does("trace", "L-2407", "--json");
    assertTrue(
        json.contains(
            "\"from\":\"2026-11-02T08:00:00Z\",\"to\":null,\"count\":16,\"wentInto\":["
                + "{\"code\":\"U-1\""),
        json);
    refused("nothing in the book has the number NO-1", "history", "trace NO-1");
  }

  @Test
  void piecesOfOneLotShareItsLineAndAChangedMagnetShowsBothLives() {
    shop.does(Day.words("rotor open STIR-IN --serial R-1"));
    shop.does(
        "place",
        "R-1",
        shop.file("p.csv", "slot,piece,facing_deg\n1,L-2404/1,0\n2,L-2404/2,270\n3,L-2404,180\n"));
    shop.at(Clock.fixed(Instant.parse("2026-11-02T09:00:00Z"), ZoneOffset.UTC));
    String changed = shop.file("r.csv", "slot,piece,facing_deg\n3,L-2404,180\n");
    shop.does(Day.words("place R-1", changed, "--rework", "--why", "chipped"));
    assertEquals(
        """
        R-1 (rotor, open)
        made from
          L-2404/0001 (piece, usable) 2026-11-02 08:00
          L-2404/0002 (piece, usable) 2026-11-02 08:00
          each of these 2:
            L-2404 (lot, accepted)
              FH-88107 (supplier lot)
          L-2404 (lot, accepted), 1 magnet 2026-11-02 08:00 to 2026-11-02 09:00
          L-2404 (lot, accepted), 1 magnet 2026-11-02 09:00
          each of these 2:
            FH-88107 (supplier lot)
        """,
        shop.does("trace", "R-1"));
    assertEquals(
        "rotor R-1 is scrapped, and with it what stood in it\n",
        shop.does(Day.words("rotor scrap R-1 --why cured")));
    refused("rotor R-1 is scrapped already", "rotor show R-1", "rotor scrap R-1 --why cured");
    refused("rotor R-1 is scrapped", "rotor show R-1", "plan R-1 --from L-2404");
  }
}
