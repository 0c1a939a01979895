package lodebook.ui.desk.words;

import java.util.OptionalDouble;
import java.util.regex.Pattern;

/// Numbers as people and meters type them: with a comma or a point, with or without a sign.
public final class TypedNumber {
  /// No ring of the shop's magnets reads more than this many tesla; a larger value is asked back.
  public static final double MOST_TESLA = 1.5;

  private static final Pattern NUMBER = Pattern.compile("[+-]?(\\d+([.,]\\d*)?|[.,]\\d+)");

  private TypedNumber() {}

  /// The number of a text, or nothing where it is none. A comma and a point both part decimals, so
  /// a text with both, or with one of them twice, is no number; groups of digits are not accepted.
  public static OptionalDouble of(String text) {
    String plain = text.strip().replace('\u2212', '-').replace("\u00a0", "").replace(" ", "");
    if (!NUMBER.matcher(plain).matches()) {
      return OptionalDouble.empty();
    }
    return OptionalDouble.of(Double.parseDouble(plain.replace(',', '.')));
  }
}
