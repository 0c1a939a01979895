package lodebook.ui.desk.run;

import java.util.LinkedHashSet;
import java.util.Set;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import java.util.function.Supplier;
import javafx.animation.PauseTransition;
import javafx.application.Platform;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.util.Duration;

/// Does work on a few threads of its own.
public final class BackgroundRunner implements Runner, AutoCloseable {
  private static final int THREADS = 3;
  private static final Duration PATIENCE = Duration.millis(500);
  private static final long LEAVE_SECONDS = 20;

  private final Troubles troubles;
  private final ExecutorService threads;
  private final Set<Job> lasting = new LinkedHashSet<>();
  private final ReadOnlyStringWrapper slow = new ReadOnlyStringWrapper("");

  /// What a person reads of one piece of work; two pieces are never the same.
  private static final class Job {
    final String doing;

    Job(String doing) {
      this.doing = doing;
    }
  }

  /// @param troubles turns failures into words
  public BackgroundRunner(Troubles troubles) {
    this.troubles = troubles;
    this.threads =
        Executors.newFixedThreadPool(
            THREADS, Thread.ofPlatform().daemon().name("desk-work-", 1).factory());
  }

  @Override
  public <T> void run(String doing, Supplier<T> work, Consumer<T> done, Consumer<Trouble> failed) {
    Job job = new Job(doing);
    PauseTransition patience = new PauseTransition(PATIENCE);
    patience.setOnFinished(_ -> show(job));
    patience.play();
    threads.execute(
        () -> {
          try {
            T outcome = work.get();
            Platform.runLater(() -> end(job, patience, () -> done.accept(outcome)));
          } catch (RuntimeException | Error failure) {
            Trouble trouble = troubles.of(failure);
            Platform.runLater(() -> end(job, patience, () -> failed.accept(trouble)));
          }
        });
  }

  private void show(Job job) {
    lasting.add(job);
    slow.set(job.doing);
  }

  private void end(Job job, PauseTransition patience, Runnable tell) {
    patience.stop();
    lasting.remove(job);
    slow.set(lasting.isEmpty() ? "" : lasting.iterator().next().doing);
    tell.run();
  }

  @Override
  public ReadOnlyStringProperty slow() {
    return slow.getReadOnlyProperty();
  }

  /// Lets what is begun end, for a while, and takes nothing new.
  @Override
  public void close() {
    threads.shutdown();
    try {
      if (!threads.awaitTermination(LEAVE_SECONDS, TimeUnit.SECONDS)) {
        threads.shutdown();
      }
    } catch (InterruptedException leaving) {
      threads.shutdown();
    }
  }
}
