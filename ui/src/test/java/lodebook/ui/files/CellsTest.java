package lodebook.ui.files;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// What the single rows of each importer refuse, sentence by sentence.
class CellsTest {
  @TempDir Path folder;
  private FileBench bench = new FileBench(Path.of("."));

  @BeforeEach
  void open() {
    bench = new FileBench(folder);
  }

  private void check(String importer, String rows, String... expected) {
    Importer kind = Importer.named(importer);
    Source file = bench.file("a.csv", kind.header() + "\n" + rows);
    assertEquals(List.of(expected), bench.problems(file, kind.reader()));
  }

  @Test
  void pieceReadings() {
    check(
        "piece",
        "1,C,1,-325.9,mT,1,20\n2,C,2,325.9,mm,1,20\n3,C,3,mT,325.9,1,20\n0,C,4,1,T,-1,-300\n",
        "a.csv:2:7: value is -325.9, expected a positive value: it is read over the north face"
            + " (south face, or the sign inverted?)",
        "a.csv:3:13: unit is \"mm\", expected one of mT, T, G, kG (nearest: mT)",
        "a.csv:4:7: value is \"mT\", expected a number",
        "a.csv:4:10: unit is \"325.9\", expected one of mT, T, G, kG",
        "a.csv:5:1: piece is \"0\", expected the number of a piece or L-2404/NUMBER",
        "a.csv:5:11: standoff_mm is -1, expected 0 or more",
        "a.csv:5:14: temperature_C is -300, expected a temperature above -273.15 in degrees"
            + " Celsius");
  }

  @Test
  void pieceReadingsThatRepeatOrShareACell() {
    check(
        "piece",
        "1,C,1,325.9,mT,1,20\nL-2404/0001,C,1,325.90,mT,1.0,20\n2,c,1,320,mT,1,20\n1,D,1,325,mT,1,20\n",
        "a.csv:3:1: piece L-2404/0001 stands here again after line 2, expected it once",
        "a.csv:4:5: tray c cell 1 already holds piece 1 in this file, expected one piece in a cell",
        "a.csv:5:5: piece 1 stands in tray and cell C 1 and in D 1, expected one place");
    check(
        "piece",
        "1,C,,325.9,mT,1,20\nL-9/1,,,1,T,1,\n",
        "a.csv:2:5: cell is empty though tray is given, expected both or neither",
        "a.csv:3:1: piece L-9/1 belongs to another lot, expected a piece of lot L-2404");
  }

  @Test
  void sameRowAgainWhenAsked() {
    Importer kind = Importer.named("piece");
    Source file = bench.file("a.csv", kind.header() + "\n1,C,1,3,G,1,20\n1,C,1,3,G,1,20\n");
    assertEquals(2, PieceReadingFile.read(file, "L-2404", true).count());
  }

  @Test
  void decimalCommaBetweenCommas() {
    check(
        "piece",
        "1,C,1,325,9,mT,1,20\n2,C,2,\"325,9\",mT,1,20\n",
        "a.csv:2:18: the row has 8 fields, expected 7 as in the header row (a decimal comma between"
            + " commas? write a point)",
        "a.csv:3:7: value is \"325,9\", expected a decimal point where commas separate: 325.9");
  }

  @Test
  void types() {
    check(
        "type",
        "B-1,block,,4,10,4,,,N42,0.05,Ni\nB-1,cube,4,4,10,,,,N42,0.05,Ni\nA-1,arc,,,10,20,30,400,N42,-1,Ni\n",
        "a.csv:2:11: a block needs thickness_mm, expected a number above 0",
        "a.csv:2:17: a block has no diameter_mm but 4 is given, expected an empty field",
        "a.csv:3:1: type B-1 stands here again after line 2, expected it once",
        "a.csv:3:5: shape is \"cube\", expected one of arc, block, disc, rod",
        "a.csv:4:17: the inner diameter is 30 mm, expected less than the outer one (20 mm)",
        "a.csv:4:20: the segment spans 400 degrees, expected less than 360",
        "a.csv:4:28: tolerance_mm is -1, expected 0 or more");
  }

  @Test
  void lots() {
    check(
        "lot",
        "17,BLK,s,02.11.2026,0,,1.3e4,\nL-1,BLK,,2026-02-30,1.5,,,\nl-1,BLK,s,2026-02-03,5,,x,\n",
        "a.csv:2:1: lot is \"17\", expected 1 to 40 letters, digits, '.', '_' or '-', and not digits"
            + " alone",
        "a.csv:2:10: received is \"02.11.2026\", expected a day such as 2026-11-02",
        "a.csv:2:21: count is \"0\", expected a whole number from 1",
        "a.csv:2:24: certificate_br_mT is 1.3e4, expected a remanence above 0 and up to 2000 mT",
        "a.csv:3:9: supplier is empty, expected a value",
        "a.csv:3:10: received is \"2026-02-30\", expected a day such as 2026-11-02",
        "a.csv:3:21: count is \"1.5\", expected a whole number from 1",
        "a.csv:4:1: lot l-1 stands here again after line 3, expected it once",
        "a.csv:4:25: certificate_br_mT is \"x\", expected a number");
  }

  @Test
  void placements() {
    check(
        "placement",
        "1,L-1/1,0\n1,L-1/0001,90\n2,17,out\n3,L-1,720\n",
        "a.csv:3:1: slot 1 stands here again after line 2, expected it once",
        "a.csv:3:3: piece L-1/0001 stands here again after line 2, expected it once",
        "a.csv:4:3: piece is \"17\", expected a piece as LOT/NUMBER or, for an unmeasured magnet, its"
            + " LOT",
        "a.csv:4:6: facing_deg is \"out\", expected a number",
        "a.csv:5:7: facing_deg is 720, expected an angle from 0 to 360 (0 out, 90 to next, 180 in,"
            + " 270 to previous)");
  }

  @Test
  void surveys() {
    check(
        "survey",
        "1,center,radial,1,mT\n2,centre,axial,1e999,Gauss\nx,centre,radial,1,\n",
        "a.csv:2:3: spot is \"center\", expected one of centre, to-next (nearest: centre)",
        "a.csv:3:10: component is \"axial\", expected one of radial, tangential (nearest: radial)",
        "a.csv:3:16: value is \"1e999\", expected a number",
        "a.csv:3:22: unit is \"Gauss\", expected one of mT, T, G, kG",
        "a.csv:4:1: slot is \"x\", expected a whole number from 1",
        "a.csv:4:19: unit is empty, expected a value");
  }

  @Test
  void surveyWithoutMeter() {
    Source file = bench.file("a.csv", "slot,spot,component,value,unit\n1,centre,radial,1,mT\n");
    assertEquals(
        List.of(
            "a.csv:2:1: no meter is named, expected a column meter with a value in every row, or"
                + " --meter METER"),
        bench.problems(file, source -> SurveyFile.read(source, false)));
  }

  @Test
  void grades() {
    check(
        "grade",
        "N1,1320,1280,-12,0.9,80,0,x\n",
        "a.csv:2:9: br_high_mT is 1280, expected at least br_low_mT (1320)",
        "a.csv:2:14: br_percent_per_K is -12, expected between -1 and 1 (about -0.12 for NdFeB)",
        "a.csv:2:18: recoil_permeability is 0.9, expected 1 to 2 (1 switches mutual magnetisation"
            + " off)",
        "a.csv:2:25: density_kg_m3 is 0, expected a number above 0");
  }

  @Test
  void moves() {
    check(
        "move",
        "L-1/1,C,1\nL-1/0001,C,2\nL-1/3,C,1\n",
        "a.csv:3:1: piece L-1/0001 stands here again after line 2, expected it once",
        "a.csv:4:9: tray C cell 1 stands here again after line 2, expected it once");
  }

  @Test
  void timesWithAndWithoutOffset() {
    Source file =
        bench.file(
            "a.csv",
            "slot,piece,facing_deg,at\n1,L-1,0,2026-11-02T14:30\n2,L-1,0,2026-11-02T14:30Z\n3,L-1,0,2026-11-02 14:30:15\n4,L-1,0,2026-11-02T14:30+02:00\n");
    assertEquals(
        List.of(
            "2026-11-02T13:30:00Z",
            "2026-11-02T14:30:00Z",
            "2026-11-02T13:30:15Z",
            "2026-11-02T12:30:00Z"),
        PlacementFile.read(file).all().stream().map(p -> String.valueOf(p.at())).toList());
    check("placement", "1,L-1,soon\n", "a.csv:2:7: facing_deg is \"soon\", expected a number");
  }
}
