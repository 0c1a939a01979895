package lodebook.ui.desk;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledIfSystemProperty;
import org.junit.jupiter.api.io.TempDir;

/// Makes the pictures of all rooms: `mvn -pl ui -am test -Dtest=ScreensTest
/// -Dsurefire.failIfNoSpecifiedTests=false -Dscreens=../docs/screens`, the folder seen from `ui`.
@Tag("screens")
@EnabledIfSystemProperty(named = "screens", matches = ".+")
class ScreensTest {
  @TempDir
  @SuppressWarnings("NullAway.Init")
  private Path work;

  @Test
  void everyRoomHasItsPictures() throws IOException {
    Path into = Path.of(System.getProperty("screens", "target/screens"));
    ScreenStates.all(new Screens(into, work), "");
    try (Stream<Path> pictures = Files.list(into)) {
      long count = pictures.filter(p -> p.toString().endsWith(".png")).count();
      assertTrue(count >= 33, "only " + count + " pictures");
    }
  }
}
