package lodebook.db.keep;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import lodebook.db.refusal.Refusal;

/// The head of a chained history as it is printed: the number of a line and the first eight digits
/// of its hash, `1024-9f3c01ab`.
///
/// @param sequence number of the line
/// @param digits eight hexadecimal digits
public record Head(long sequence, String digits) {
  private static final Pattern PRINTED = Pattern.compile("([0-9]{1,18})-([0-9a-f]{8})");

  /// The head of a line.
  static Head of(long sequence, String hash) {
    return new Head(sequence, hash.substring(0, 8));
  }

  /// Reads a printed head; anything else is wrong input.
  public static Head parse(String printed) {
    Matcher parts = PRINTED.matcher(printed.strip().toLowerCase(java.util.Locale.ROOT));
    if (!parts.matches()) {
      throw Refusal.wrongInput("head.malformed", printed).remedy("lodebook book info");
    }
    return new Head(Long.parseLong(parts.group(1)), parts.group(2));
  }

  @Override
  public String toString() {
    return sequence + "-" + digits;
  }
}
