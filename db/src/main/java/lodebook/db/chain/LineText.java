package lodebook.db.chain;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;

/// A history line as the text that is hashed.
///
/// The text is `1` (the version), a line feed, then one item after another. An item is a list of
/// strings: how many, a space, then each as its length in UTF-8 bytes, a colon and itself; a line
/// feed ends it. So no two different lists have the same text.
public final class LineText {
  /// The hash before the first line.
  public static final String START = "0".repeat(64);

  private static final String VERSION = "1\n";

  private LineText() {}

  /// The text of a list of items.
  public static String encode(List<List<String>> items) {
    StringBuilder text = new StringBuilder(VERSION);
    for (List<String> item : items) {
      text.append(item.size()).append(' ');
      for (String part : item) {
        text.append(part.getBytes(StandardCharsets.UTF_8).length).append(':').append(part);
      }
      text.append('\n');
    }
    return text.toString();
  }

  /// The items of a text.
  ///
  /// @throws IllegalArgumentException if the text is none that [#encode(List)] makes
  public static List<List<String>> decode(String text) {
    if (!text.startsWith(VERSION)) {
      throw new IllegalArgumentException("the version of a history line is not 1");
    }
    byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
    Reader reader = new Reader(bytes, VERSION.length());
    List<List<String>> items = new ArrayList<>();
    while (reader.at < bytes.length) {
      items.add(reader.item());
    }
    return items;
  }

  /// SHA-256 of the previous hash and a text, 64 hexadecimal digits.
  public static String hash(String previous, String text) {
    try {
      MessageDigest digest = MessageDigest.getInstance("SHA-256");
      digest.update(previous.getBytes(StandardCharsets.UTF_8));
      return HexFormat.of().formatHex(digest.digest(text.getBytes(StandardCharsets.UTF_8)));
    } catch (NoSuchAlgorithmException missing) {
      throw new IllegalStateException("every Java has SHA-256", missing);
    }
  }

  private static final class Reader {
    private final byte[] bytes;
    private int at;

    Reader(byte[] bytes, int at) {
      this.bytes = bytes;
      this.at = at;
    }

    List<String> item() {
      int parts = number(' ');
      List<String> item = new ArrayList<>();
      for (int i = 0; i < parts; i++) {
        int length = number(':');
        if (length > bytes.length - at) {
          throw new IllegalArgumentException("a history line is cut short");
        }
        item.add(new String(bytes, at, length, StandardCharsets.UTF_8));
        at += length;
      }
      expect('\n');
      return item;
    }

    private int number(char end) {
      int number = 0;
      int from = at;
      while (at < bytes.length && bytes[at] >= '0' && bytes[at] <= '9' && at - from < 9) {
        number = number * 10 + bytes[at] - '0';
        at++;
      }
      if (at == from) {
        throw new IllegalArgumentException("a history line holds no number where one belongs");
      }
      expect(end);
      return number;
    }

    private void expect(char sign) {
      if (at >= bytes.length || bytes[at] != sign) {
        throw new IllegalArgumentException("a history line does not hold what it should");
      }
      at++;
    }
  }
}
