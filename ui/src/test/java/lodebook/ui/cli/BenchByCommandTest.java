package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// Trays, lots and surveys at the bench, as a person types them.
class BenchByCommandTest {
  @TempDir static Path folder = Path.of(".");

  @SuppressWarnings("NullAway.Init")
  private static Shop shop;

  @BeforeAll
  static void open() {
    shop = Day.ready(folder);
  }

  private void said(int code, String out, String err, String line, String... more) {
    assertEquals(new Shop.Said(code, out, err), shop.run(Day.words(line, more)));
  }

  @Test
  void aDroppedTray() {
    said(
        0,
        "tray T-11 is unsure: 26 pieces count as unmeasured until read again\n",
        "next: lodebook piece import LOT readings.csv\n",
        "tray unsure T-11 --why dropped");
    assertEquals(
        """
        PIECE       L-2404/0001, usable
        Br at 20 C  not measured
        lies        tray T-11 cell A1
        stands      -
        planned     -
        READ              BY     mT  STANDOFF mm   C  METER
        2026-11-03 08:00  AB  326.5            1  21  -      in doubt
        nothing was decided about it yet
        """,
        shop.does("piece", "show", "L-2404/1"));
    said(
        4,
        "",
        "lodebook: there is no tray T-77\ntry: lodebook piece list LOT\n",
        "tray unsure T-77 --why x");
    said(
        2,
        "",
        "lodebook: --why says nothing: give a reason\ntry: lodebook help tray unsure\n",
        "tray unsure T-11 --why",
        " ");
    String moves =
        shop.file(
            "m.csv",
            "piece,tray,cell\nL-2404/1,T-11,A2\nL-2404/99,T-11,Z9\nL-2404/3,GM-1,1\nL-7/3,T-1,1\n");
    said(
        4,
        "",
        """
        m.csv:2:15: cell T-11 A2 holds piece L-2404/0002 (try: lodebook tray show T-11)
        m.csv:3:1: there is no piece L-2404/0099 (try: lodebook piece list L-2404)
        m.csv:4:10: GM-1 is taken already: it is a meter (try: lodebook trace GM-1)
        m.csv:5:1: there is no lot L-7 (try: lodebook lot list)
        nothing was changed
        """,
        "tray move",
        moves);
  }

  @Test
  void lotsAndPieces() {
    said(
        3,
        "",
        "lodebook: a lot has 1 piece or more, not 0\ntry: lodebook lot count L-2404 N --why TEXT\n",
        "lot count L-2404 0 --why x");
    said(
        2,
        "",
        "lodebook: N is x, expected a whole number\ntry: lodebook help lot count\n",
        "lot count L-2404 x --why x");
    said(
        4,
        "",
        "lodebook: lot L-2404 is accepted already\ntry: lodebook lot show L-2404\n",
        "lot accept L-2404 --why x");
    said(
        3,
        "",
        """
        lodebook: the accuracy of meter GM-2 is -1.0 %, expected 0 or more and below 100
        try: lodebook help meter add
        """,
        "meter add GM-2 --accuracy-percent -1 --calibration-due 2027-06-30");
    said(
        2,
        "",
        """
        lodebook: --calibration-due is 30.6.2027, expected a day such as 2026-11-02
        try: lodebook help meter add
        """,
        "meter add GM-2 --accuracy-percent 1 --calibration-due 30.6.2027");
    said(
        3,
        "",
        """
        lodebook: "L-2404" names no piece, expected LOT/NUMBER such as L-2404/0017
        try: lodebook piece list LOT
        """,
        "piece show L-2404");
    shop.does(Day.words("piece hold L-2404/5 --why chipped"));
    said(
        4,
        "",
        "lodebook: piece L-2404/0005 is on hold\ntry: lodebook piece free L-2404/0005 --why TEXT\n",
        "piece hold L-2404/5 --why chipped");
    String again =
        shop.file(
            "again.csv",
            "piece,tray,cell,value,unit,standoff_mm,temperature_C,meter\n30,,,330,mT,1,20,GM-1\n");
    said(
        0,
        "1 reading of 1 piece taken in, 1 of them new\n",
        "next: lodebook lot show L-2404\n",
        "piece import L-2404",
        again);
    said(
        4,
        "",
        """
        lodebook: the reading of the file (1) is in the book already for lot L-2404
        try: lodebook piece import L-2404 FILE --again --why TEXT
        """,
        "piece import L-2404",
        again);
  }

  @Test
  void aMeterThatNobodyKnowsIsToldOnce() {
    shop.does(Day.words("rotor open STIR-IN --serial R-1"));
    shop.does(
        Day.words(
            "meter add CAL-1 --kind length --accuracy-percent 1", "--calibration-due=2027-06-30"));
    String rows =
        IntStream.rangeClosed(1, 12)
            .mapToObj(slot -> slot + ",centre,radial,1,mT\n")
            .collect(Collectors.joining());
    String survey = shop.file("s.csv", "slot,spot,component,value,unit\n" + rows);
    said(
        4,
        "",
        "lodebook: there is no meter NO\ntry: lodebook meter list\n",
        "survey import R-1 --meter NO",
        survey);
    said(
        4,
        "",
        "lodebook: CAL-1 is a length meter; a survey needs a field meter\ntry: lodebook meter list\n",
        "survey import R-1 --meter CAL-1",
        survey);
    said(
        3,
        "",
        """
        s.csv:2:1: no meter is named, expected a column meter with a value in every row, or --meter METER
        nothing was changed
        try: lodebook survey import --example FILE
        """,
        "survey import R-1",
        survey);
  }
}
