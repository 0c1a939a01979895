package lodebook.ui.files;

import java.io.BufferedInputStream;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/// Opens a file as UTF-8 text, or says in a sentence why it is none.
final class TextFile {
  private static final int HEAD = 4096;
  private static final byte[] ZIP = {'P', 'K', 3, 4};

  private TextFile() {}

  /// A reader behind a byte-order mark; it reports bytes that are not UTF-8 by a
  /// `CharacterCodingException`.
  ///
  /// @throws BadFile where the file is missing, empty, packed, binary or in another encoding
  static BufferedReader open(Source source) {
    try {
      if (Files.isDirectory(source.path())) {
        throw source.bad(Place.START, "file.folder");
      }
      InputStream bytes = new BufferedInputStream(Files.newInputStream(source.path()), 1 << 16);
      try {
        return reader(source, bytes);
      } catch (IOException | RuntimeException failed) {
        bytes.close();
        throw failed;
      }
    } catch (NoSuchFileException missing) {
      throw source.bad(Place.START, "file.missing");
    } catch (IOException unreadable) {
      throw source.bad(Place.START, "file.unreadable", unreadable);
    }
  }

  private static BufferedReader reader(Source source, InputStream bytes) throws IOException {
    bytes.mark(HEAD);
    byte[] head = bytes.readNBytes(HEAD);
    bytes.reset();
    boolean mark = startsWith(head, (byte) 0xEF, (byte) 0xBB, (byte) 0xBF);
    if (head.length == (mark ? 3 : 0)) {
      throw source.bad(Place.START, "file.empty");
    }
    if (startsWith(head, ZIP)) {
      throw source.bad(Place.START, "file.zip");
    }
    if (startsWith(head, (byte) 0xFF, (byte) 0xFE)
        || startsWith(head, (byte) 0xFE, (byte) 0xFF)
        || everySecondZero(head)) {
      throw source.bad(Place.START, "file.utf16");
    }
    if (contains(head, (byte) 0)) {
      throw source.bad(Place.START, "file.binary");
    }
    if (mark) {
      bytes.skipNBytes(3);
    }
    return new BufferedReader(new InputStreamReader(bytes, strict()), 1 << 16);
  }

  private static CharsetDecoder strict() {
    return StandardCharsets.UTF_8
        .newDecoder()
        .onMalformedInput(CodingErrorAction.REPORT)
        .onUnmappableCharacter(CodingErrorAction.REPORT);
  }

  private static boolean startsWith(byte[] head, byte... start) {
    return head.length >= start.length
        && Arrays.equals(head, 0, start.length, start, 0, start.length);
  }

  private static boolean contains(byte[] head, byte wanted) {
    for (byte b : head) {
      if (b == wanted) {
        return true;
      }
    }
    return false;
  }

  private static boolean everySecondZero(byte[] head) {
    int[] zeros = new int[2];
    for (int i = 0; i < head.length; i++) {
      zeros[i % 2] += head[i] == 0 ? 1 : 0;
    }
    return Math.max(zeros[0], zeros[1]) * 4 > head.length && Math.min(zeros[0], zeros[1]) == 0;
  }

  /// The refusal for a file with bytes that are not UTF-8: names the first place.
  static BadFile notUtf8(Source source) {
    try (InputStream bytes = new BufferedInputStream(Files.newInputStream(source.path()))) {
      int line = 1;
      byte[] buffer = new byte[1 << 12];
      int length = 0;
      for (int b = bytes.read(); b >= 0; b = bytes.read()) {
        if (b == '\n') {
          Place place = firstWrong(buffer, length, line);
          if (place != null) {
            return source.bad(place, "file.encoding");
          }
          line++;
          length = 0;
        } else {
          if (length == buffer.length) {
            buffer = Arrays.copyOf(buffer, 2 * length);
          }
          buffer[length++] = (byte) b;
        }
      }
      Place place = firstWrong(buffer, length, line);
      return source.bad(place == null ? new Place(line, 1) : place, "file.encoding");
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  private static @Nullable Place firstWrong(byte[] bytes, int length, int line) {
    CharBuffer text = CharBuffer.allocate(length + 1);
    CoderResult result = strict().decode(ByteBuffer.wrap(bytes, 0, length), text, true);
    return result.isError() ? new Place(line, text.position() + 1) : null;
  }
}
