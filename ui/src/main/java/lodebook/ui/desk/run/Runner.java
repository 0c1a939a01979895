package lodebook.ui.desk.run;

import java.util.function.Consumer;
import java.util.function.Supplier;
import javafx.beans.property.ReadOnlyStringProperty;

/// Does work away from the screen and brings its outcome back.
///
/// Called from the screen's thread; outcomes arrive there. Nothing is ever interrupted: the book
/// does not bear it.
public interface Runner {
  /// Does something.
  ///
  /// @param doing what a person reads while it takes long
  /// @param work what is done, elsewhere
  /// @param done takes what came out
  /// @param failed takes what went wrong, in words
  <T> void run(String doing, Supplier<T> work, Consumer<T> done, Consumer<Trouble> failed);

  /// What is being done for longer than half a second; empty where nothing is.
  ReadOnlyStringProperty slow();
}
