package lodebook.ui.cli;

import java.util.concurrent.atomic.AtomicLong;
import java.util.function.DoubleConsumer;

/// Tells the best so far on standard error while a search goes on, twice a second at most.
final class PlanProgress implements DoubleConsumer {
  private static final long BETWEEN_NANOS = 500_000_000;

  private final Session session;
  private final boolean wanted;
  private final long began = System.nanoTime();
  private final AtomicLong next = new AtomicLong(began + BETWEEN_NANOS);

  /// @param asked whether it is wanted although nobody watches a terminal
  PlanProgress(Session session, boolean asked) {
    this.session = session;
    boolean quiet = session.common().quiet || session.common().json;
    wanted = !quiet && (asked || session.around().watched());
  }

  @Override
  public void accept(double ratio) {
    long now = System.nanoTime();
    long due = next.get();
    if (wanted && now - due >= 0 && next.compareAndSet(due, now + BETWEEN_NANOS)) {
      session.remark(
          session
              .words()
              .say(
                  "plan.progress",
                  PlanWords.percent(ratio),
                  Math.round((now - began) / 1e8) / 10.0));
    }
  }
}
