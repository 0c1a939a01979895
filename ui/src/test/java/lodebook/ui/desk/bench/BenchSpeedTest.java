package lodebook.ui.desk.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import lodebook.ui.desk.DeskShop;
import lodebook.ui.desk.station.Station;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// How long a builder waits at a ring of 48 slots, in processor time of the thread that does it
/// all.
@Tag("slow")
class BenchSpeedTest {
  private static final double MOST_MILLISECONDS = 50;

  @TempDir
  @SuppressWarnings("NullAway.Init")
  private Path folder;

  private final ThreadMXBean threads = ManagementFactory.getThreadMXBean();

  private double milliseconds(Runnable work) {
    long before = threads.getCurrentThreadCpuTime();
    work.run();
    return (threads.getCurrentThreadCpuTime() - before) / 1e6;
  }

  private static double median(List<Double> all) {
    Collections.sort(all);
    return all.get(all.size() / 2);
  }

  @Test
  void aVerdictIsThereInFiftyMilliseconds() {
    DeskShop shop = DeskShop.in(folder);
    shop.ringOf48("R-48");
    Station station = shop.station(Locale.ENGLISH, "TB");
    BenchModel bench = new BenchModel(station, shop.runner(station));
    bench.sitDown("R-48");
    List<Double> right = new ArrayList<>();
    List<Double> wrong = new ArrayList<>();
    List<Double> next = new ArrayList<>();
    for (int slots = 0; slots < 46; slots++) {
      BenchStep step = bench.step().get();
      assertNotNull(step, bench.said().get().toString());
      boolean turned = slots > 20 && slots % 5 == 0;
      bench.typed().set(reads(step, turned));
      double first = milliseconds(bench::enter);
      if (bench.phase().get() == BenchPhase.DOUBT) {
        wrong.add(first);
        bench.turned();
        bench.typed().set(reads(bench.step().get(), false));
        bench.enter();
      } else if (!turned) {
        right.add(first);
      }
      BenchStep second = bench.step().get();
      assertNotNull(second);
      bench.typed().set(reads(second, turned && wrong.isEmpty()));
      next.add(milliseconds(bench::enter));
      if (bench.phase().get() == BenchPhase.DOUBT) {
        bench.goOn();
      }
      assertEquals(BenchPhase.STEP, bench.phase().get(), bench.said().get().toString());
    }
    String figures =
        "right %.1f ms, wrong %.1f ms, with the next step %.1f ms"
            .formatted(median(right), median(wrong), median(next));
    assertTrue(median(right) <= MOST_MILLISECONDS, figures);
    assertTrue(median(wrong) <= MOST_MILLISECONDS, figures);
  }

  private static String reads(BenchStep step, boolean turned) {
    double tesla =
        turned
            ? BenchGauge.tesla(step, step.toRead().getFirst(), step.slot())
            : BenchGauge.tesla(step, step.toRead().getFirst());
    return String.format(Locale.ROOT, "%.1f", tesla * 1e3);
  }
}
