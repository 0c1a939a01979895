package lodebook.ui.craft;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;

/// The version of this program, which the build wrote beside its classes.
public final class BuiltVersion {
  private BuiltVersion() {}

  /// Such as `0.1.0`.
  public static String text() {
    try (InputStream in = BuiltVersion.class.getResourceAsStream("/lodebook/ui/build.properties")) {
      if (in == null) {
        throw new IllegalStateException("the build wrote no version");
      }
      Properties properties = new Properties();
      properties.load(in);
      return properties.getProperty("version");
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }
}
