package lodebook.ui.process;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

/// The processes of these tests are started as the start script starts the program.
class StationTest {
  @Test
  void flagsAreThoseOfTheStartScript() throws Exception {
    String script = Files.readString(Path.of("../lodebook"));
    int split = Station.flags().lastIndexOf(' ');
    String fast = "fast=\"" + Station.flags().substring(0, split) + "\"";
    String access = " $fast " + Station.flags().substring(split + 1) + " ";
    assertTrue(script.contains(fast), fast);
    assertTrue(script.contains(access), access);
  }
}
