package lodebook.ui.desk;

import java.time.Duration;
import java.util.concurrent.Callable;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;
import javafx.application.Platform;

/// The screen's thread on the headless platform.
public final class Fx {
  private static final CountDownLatch STARTED = new CountDownLatch(1);

  static {
    System.setProperty("glass.platform", "Headless");
    System.setProperty("prism.order", "sw");
    Platform.startup(STARTED::countDown);
    Platform.setImplicitExit(false);
  }

  private Fx() {}

  /// Does something on the screen's thread and waits for it.
  public static <T> T on(Callable<T> work) {
    CompletableFuture<T> outcome = new CompletableFuture<>();
    Platform.runLater(
        () -> {
          try {
            outcome.complete(work.call());
          } catch (Exception | AssertionError failure) {
            outcome.completeExceptionally(failure);
          }
        });
    try {
      return outcome.get(60, TimeUnit.SECONDS);
    } catch (java.util.concurrent.ExecutionException failed) {
      if (failed.getCause() instanceof AssertionError wrong) {
        throw wrong;
      }
      throw new IllegalStateException(failed.getCause());
    } catch (InterruptedException | java.util.concurrent.TimeoutException late) {
      throw new IllegalStateException(late);
    }
  }

  /// As [#on], with nothing to return.
  public static void run(Runnable work) {
    boolean done =
        on(
            () -> {
              work.run();
              return true;
            });
    if (!done) {
      throw new IllegalStateException();
    }
  }

  /// Waits until something is so on the screen's thread.
  public static void until(String what, Duration patience, BooleanSupplier so) {
    long end = System.nanoTime() + patience.toNanos();
    while (!on(so::getAsBoolean)) {
      if (System.nanoTime() > end) {
        throw new AssertionError("after " + patience + " still not so: " + what);
      }
      java.util.concurrent.locks.LockSupport.parkNanos(5_000_000);
    }
  }
}
