package lodebook.db.stock;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/// By which a row of readings is known again.
final class Fingerprint {
  private Fingerprint() {}

  /// The first 16 bytes of the SHA-256 of all that the row says, in hexadecimal digits.
  static String of(ReadingRow row) {
    try {
      byte[] digest =
          MessageDigest.getInstance("SHA-256")
              .digest(row.canonical().getBytes(StandardCharsets.UTF_8));
      return HexFormat.of().formatHex(digest, 0, 16);
    } catch (NoSuchAlgorithmException missing) {
      throw new IllegalStateException("every Java has SHA-256", missing);
    }
  }
}
