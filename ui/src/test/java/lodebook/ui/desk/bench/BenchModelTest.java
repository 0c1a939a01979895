package lodebook.ui.desk.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.time.Duration;
import java.util.Locale;
import lodebook.db.builds.Rotors;
import lodebook.db.surveys.FluxUnit;
import lodebook.db.surveys.Surveys;
import lodebook.ui.desk.DeskShop;
import lodebook.ui.desk.room.Said;
import lodebook.ui.desk.station.Station;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// A day at the bench without a window.
class BenchModelTest {
  @TempDir
  @SuppressWarnings("NullAway.Init")
  private Path folder;

  @SuppressWarnings("NullAway.Init")
  private DeskShop shop;

  @SuppressWarnings("NullAway.Init")
  private Station station;

  @SuppressWarnings("NullAway.Init")
  private BenchModel bench;

  @SuppressWarnings("NullAway.Init")
  private BenchGauge gauge;

  @BeforeEach
  void sitDown() {
    shop = DeskShop.in(folder);
    station = shop.station(Locale.ENGLISH, "TB");
    bench = new BenchModel(station, shop.runner(station));
    gauge = new BenchGauge(station);
    bench.sitDown("R-9");
  }

  private BenchStep step() {
    BenchStep step = bench.step().get();
    assertNotNull(step, bench.said().get().toString());
    return step;
  }

  private void type(String text) {
    bench.typed().set(text);
    bench.enter();
  }

  private void right() {
    BenchStep now = step();
    double tesla = BenchGauge.tesla(now, now.toRead().getFirst());
    type(String.format(Locale.ROOT, "%.1f", tesla * 1e3));
  }

  @Test
  void oneStepIsOneMagnetAndItsReadings() {
    BenchStep first = step();
    assertEquals(1, first.step());
    assertEquals(2, first.toRead().size());
    assertEquals(
        "Slot 1: tray TR-C cell " + first.cell() + ", north OUT", bench.words().sentence(first));
    right();
    assertTrue(step().placed());
    assertEquals(first.slot(), step().slot());
    right();
    assertEquals(2, step().step());
    assertEquals("Slot " + first.slot() + " reads as it should.", bench.said().get().sentence());
    assertEquals(1, station.with(book -> new Rotors(book).show("R-9")).rotor().filled());
  }

  @Test
  void commaAndPointAreBothTakenAndWordsAreNot() {
    type("12 mT");
    assertEquals(
        "“12 mT” is no number. Type it as the meter shows it.", bench.said().get().sentence());
    assertEquals(0, station.with(book -> new Rotors(book).show("R-9")).rotor().filled());
    type(gauge.reads("R-9").replace('.', ','));
    assertTrue(step().placed());
  }

  @Test
  void anImpossibleValueIsAskedBackOnce() {
    type("2470");
    assertEquals(
        "2470 mT is more than any ring of ours reads. If the meter shows it, press Enter once more.",
        bench.said().get().sentence());
    assertEquals(0, station.with(book -> new Rotors(book).show("R-9")).rotor().filled());
    type("2470");
    assertEquals(BenchPhase.DOUBT, bench.phase().get());
    assertEquals(1, station.with(book -> new Rotors(book).show("R-9")).rotor().filled());
  }

  @Test
  void gaussAreTakenAsGauss() {
    bench.unit().set(FluxUnit.GAUSS);
    type(String.format(Locale.ROOT, "%.0f", 10 * Double.parseDouble(gauge.reads("R-9"))));
    assertEquals(BenchPhase.STEP, bench.phase().get());
    assertTrue(bench.last().get().endsWith(" G"), bench.last().get());
  }

  @Test
  void aReversedMagnetIsFlaggedBeforeTheNextStepAndPassesOnceTurned() {
    for (int i = 0; i < 6; i++) {
      right();
    }
    int slot = step().slot();
    while (bench.phase().get() == BenchPhase.STEP && step().slot() == slot) {
      type(gauge.reads("R-9", slot));
    }
    assertEquals(BenchPhase.DOUBT, bench.phase().get());
    assertTrue(
        bench.said().get().sentence().startsWith("Slot " + slot + " is reversed: north "),
        bench.said().get().toString());
    bench.turned();
    right();
    right();
    assertEquals(5, step().step());
    assertEquals(Said.Tone.RIGHT, bench.said().get().tone());
  }

  @Test
  void afterTheLightsWentOutTheSameReadingIsAskedFor() {
    right();
    right();
    right();
    BenchStep before = step();
    BenchModel again = new BenchModel(station, shop.runner(station));
    again.sitDown("R-9");
    BenchStep after = again.step().get();
    assertNotNull(after);
    assertEquals(before.slot(), after.slot());
    assertEquals(before.toRead(), after.toRead());
    assertTrue(after.placed());
    assertEquals(3, station.with(book -> new Surveys(book).list("R-9")).getLast().readings());
  }

  @Test
  void aBrokenPieceIsScrappedAndTheRestPlannedAnew() {
    right();
    right();
    String broken = step().magnet();
    bench.broken();
    assertEquals(BenchPhase.STEP, bench.phase().get(), bench.said().get().toString());
    assertEquals(2, step().step());
    assertTrue(!step().magnet().equals(broken), "the broken piece is offered again");
    assertEquals(1, station.with(book -> new Rotors(book).show("R-9")).rotor().filled());
  }

  @Test
  void anotherPieceOfATrayIsTakenForTheStep() {
    bench.usedAnother("TR-D E6");
    BenchStep now = step();
    assertTrue(now.placed());
    assertEquals("L-2501/0060", now.magnet());
    right();
    right();
    assertEquals(2, step().step());
  }

  @Test
  void theAdhesivesMinutesRunDown() {
    bench.mixedNow();
    assertEquals("5:00 min to work", bench.minutes().get());
    shop.time().pass(Duration.ofSeconds(61));
    bench.tick();
    assertEquals("3:59 min to work", bench.minutes().get());
    shop.time().pass(Duration.ofMinutes(4));
    bench.tick();
    assertEquals("the adhesive is over", bench.minutes().get());
  }

  @Test
  void goingOnAllTheSameLeavesItsMarkInTheBook() {
    int slot = step().slot();
    while (bench.phase().get() == BenchPhase.STEP) {
      type(gauge.reads("R-9", slot));
    }
    bench.goOn();
    assertEquals(BenchPhase.STEP, bench.phase().get());
    assertEquals(2, step().step());
    assertTrue(shop.does("history", "R-9").contains("survey check"), shop.does("history", "R-9"));
  }

  @Test
  void aWholeRotorIsBuiltAndThenWantsItsRound() {
    for (int i = 0; i < 24; i++) {
      right();
    }
    assertEquals(BenchPhase.FULL, bench.phase().get());
    assertEquals(
        "R-9 is full. Now the round: read every slot once more.", bench.said().get().sentence());
  }

  @Test
  void anUnplannedRotorIsPlannedAtTheBenchByWhoMay() {
    station.takenBy(shop.station(Locale.ENGLISH, "MK").who().get());
    bench.sitDown("R-11");
    assertEquals(BenchPhase.UNPLANNED, bench.phase().get());
    assertEquals(
        "R-11 has no plan yet. It can be planned from L-2404, L-2501.",
        bench.said().get().sentence());
    bench.planAnew();
    assertEquals("R-11", step().code());
    assertEquals(1, step().step());
  }
}
