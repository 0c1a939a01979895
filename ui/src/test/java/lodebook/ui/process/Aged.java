package lodebook.ui.process;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.h2.mvstore.DataUtils;

/// Books as they are after a pause. The engine uses space again only when what stood there is older
/// than its retention time (45 s), which it reckons from the moment in the file's two headers; a
/// test cannot wait for that, so the moment is set an hour back.
final class Aged {
  private static final int BLOCK = 4096;
  private static final long HOUR_MILLIS = 3_600_000;
  private static final Pattern CREATED = Pattern.compile("created:([0-9a-f]+)");

  private Aged() {}

  /// Makes everything in a book's file an hour older.
  static void byAnHour(Path file) throws IOException {
    byte[] content = Files.readAllBytes(file);
    for (int start = 0; start <= BLOCK; start += BLOCK) {
      String header = new String(content, start, BLOCK, StandardCharsets.ISO_8859_1);
      byte[] older = older(header.substring(0, header.indexOf('\n')));
      System.arraycopy(older, 0, content, start, older.length);
    }
    Files.write(file, content);
  }

  private static byte[] older(String header) {
    Matcher created = CREATED.matcher(header);
    if (!created.find()) {
      throw new IllegalArgumentException("no header of a book: " + header);
    }
    long moment = Long.parseLong(created.group(1), 16) - HOUR_MILLIS;
    String text =
        created
            .replaceFirst("created:" + Long.toHexString(moment))
            .replaceFirst(",fletcher:.*", "");
    byte[] bytes = text.getBytes(StandardCharsets.ISO_8859_1);
    String sum = Integer.toHexString(DataUtils.getFletcher32(bytes, 0, bytes.length));
    // a sum with fewer digits leaves nothing of the old one behind it
    String line = text + ",fletcher:" + sum + "\n";
    return String.format("%-" + (header.length() + 1) + "s", line)
        .getBytes(StandardCharsets.ISO_8859_1);
  }
}
