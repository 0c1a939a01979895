package lodebook.ui.desk.run;

import java.util.function.Consumer;
import java.util.function.Supplier;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/// Does everything at once where it is asked for.
public final class InPlaceRunner implements Runner {
  private final Troubles troubles;
  private final ReadOnlyStringWrapper slow = new ReadOnlyStringWrapper("");

  /// @param troubles turns failures into words
  public InPlaceRunner(Troubles troubles) {
    this.troubles = troubles;
  }

  @Override
  public <T> void run(String doing, Supplier<T> work, Consumer<T> done, Consumer<Trouble> failed) {
    T outcome;
    try {
      outcome = work.get();
    } catch (RuntimeException failure) {
      failed.accept(troubles.of(failure));
      return;
    }
    done.accept(outcome);
  }

  @Override
  public ReadOnlyStringProperty slow() {
    return slow.getReadOnlyProperty();
  }
}
