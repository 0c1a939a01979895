package lodebook.ui.desk;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Locale;
import java.util.function.Consumer;
import javafx.beans.property.SimpleObjectProperty;
import javafx.embed.swing.SwingFXUtils;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.SnapshotParameters;
import javafx.scene.image.WritableImage;
import javafx.scene.transform.Transform;
import javafx.stage.Stage;
import javax.imageio.ImageIO;
import lodebook.db.book.BookAddress;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.look.Theme;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.window.DeskWindow;
import lodebook.ui.desk.words.DeskWords;

/// Pictures of the rooms in the states that matter.
final class Screens {
  private final Path into;
  private final Path work;
  private int shops;

  /// @param into folder of the pictures
  /// @param work folder for the shops' books
  Screens(Path into, Path work) {
    this.into = into;
    this.work = work;
  }

  /// A way of looking at the window.
  ///
  /// @param name part of the picture's name
  /// @param width width of the window as it is laid out
  /// @param scale how much larger its picture is
  record View(String name, Theme theme, double width, double height, double scale) {
    static final View LIGHT = new View("light", Theme.LIGHT, 1280, 800, 1);
    static final View DARK = new View("dark", Theme.DARK, 1280, 800, 1);
    static final View WIDE = new View("wide", Theme.LIGHT, 1920, 1080, 1);
    static final View DOUBLE = new View("double", Theme.LIGHT, 960, 600, 2);
    static final View CONTRAST = new View("contrast", Theme.CONTRAST, 1280, 800, 1);
    static final List<View> MOST = List.of(LIGHT, DARK, WIDE, DOUBLE);
    static final List<View> FEW = List.of(LIGHT, DARK);
  }

  /// A window open in a shop, to be brought into a state.
  ///
  /// @param shop the shop
  /// @param window the window
  record Open(DeskShop shop, DeskWindow window) {
    Parent root() {
      return window.root();
    }

    Node find(String selector) {
      Node found = root().lookup(selector);
      if (found == null) {
        throw new IllegalStateException("nothing on the screen is " + selector);
      }
      return found;
    }

    /// Lays everything out as it will be seen.
    void settle() {
      root().applyCss();
      root().layout();
    }
  }

  /// Takes one state in several views.
  void take(String name, Locale language, List<View> views, Consumer<Open> bringIt) {
    DeskShop shop = DeskShop.in(work.resolve("shop-" + shops++));
    take(name, shop, shop.station(language, "TB"), views, bringIt);
  }

  /// Takes one state of a window whose book is not there yet.
  void takeEmpty(String name, Locale language, List<View> views, Consumer<Open> bringIt) {
    DeskShop shop = DeskShop.in(work.resolve("shop-" + shops++));
    Station station =
        new Station(
            new BookAddress.Folder(work.resolve("none").resolve("book")),
            "BENCH-1",
            shop.time(),
            new DeskWords(language, ZoneOffset.UTC));
    take(name, shop, station, views, bringIt);
  }

  private void take(
      String name, DeskShop shop, Station station, List<View> views, Consumer<Open> bringIt) {
    Fx.run(
        () -> {
          SimpleObjectProperty<Look> look = new SimpleObjectProperty<>(new Look(Theme.LIGHT));
          DeskWindow window = new DeskWindow(station, shop.runner(station), look);
          Stage stage = new Stage();
          Scene scene = new Scene(window.root(), 1280, 800);
          stage.setScene(scene);
          stage.show();
          Open open = new Open(shop, window);
          open.settle();
          bringIt.accept(open);
          for (View view : views) {
            look.set(new Look(view.theme()));
            write(name + "-" + view.name(), open, view);
          }
          stage.close();
        });
  }

  private void write(String name, Open open, View view) {
    Parent root = open.root();
    root.getScene().getWindow().setWidth(view.width());
    root.getScene().getWindow().setHeight(view.height());
    root.resize(view.width(), view.height());
    for (int i = 0; i < 3; i++) {
      root.applyCss();
      root.layout();
    }
    SnapshotParameters how = new SnapshotParameters();
    how.setTransform(Transform.scale(view.scale(), view.scale()));
    WritableImage image =
        new WritableImage(
            (int) (view.width() * view.scale()), (int) (view.height() * view.scale()));
    root.snapshot(how, image);
    BufferedImage picture =
        new BufferedImage(
            (int) image.getWidth(), (int) image.getHeight(), BufferedImage.TYPE_INT_RGB);
    picture.createGraphics().drawImage(SwingFXUtils.fromFXImage(image, null), 0, 0, null);
    try {
      Files.createDirectories(into);
      ImageIO.write(picture, "png", into.resolve(name + ".png").toFile());
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }
}
