package lodebook.ui.desk.room;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import javafx.scene.Node;
import javafx.scene.input.TransferMode;
import javafx.stage.FileChooser;

/// Ways in which a file comes into a room: dropped onto it, or chosen.
public final class FileDrop {
  private static final String TAKER = "lodebook.file-drop";

  private FileDrop() {}

  /// Who takes a file.
  @FunctionalInterface
  private interface Taker {
    void take(Path file);
  }

  /// A node takes files that are dropped onto it.
  public static void onto(Node node, Consumer<Path> taken) {
    node.getProperties().put(TAKER, (Taker) taken::accept);
    node.setOnDragOver(
        event -> {
          if (event.getDragboard().hasFiles()) {
            event.acceptTransferModes(TransferMode.COPY);
          }
          event.consume();
        });
    node.setOnDragDropped(
        event -> {
          List<File> files = event.getDragboard().getFiles();
          if (!files.isEmpty()) {
            drop(node, files.getFirst().toPath());
          }
          event.setDropCompleted(!files.isEmpty());
          event.consume();
        });
  }

  /// A file falls onto a node that takes files.
  public static void drop(Node node, Path file) {
    if (node.getProperties().get(TAKER) instanceof Taker taker) {
      taker.take(file);
    }
  }

  /// Asks for a file with the system's own window.
  public static void choose(Node near, String title, Consumer<Path> taken) {
    FileChooser chooser = new FileChooser();
    chooser.setTitle(title);
    chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter("CSV", "*.csv"));
    File file = chooser.showOpenDialog(near.getScene().getWindow());
    if (file != null) {
      taken.accept(file.toPath());
    }
  }
}
