package lodebook.db.builds;

import static lodebook.db.tables.Tables.CODE;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import lodebook.db.code.CodeText;
import lodebook.db.refusal.Refusal;
import org.jooq.DSLContext;

/// How a batch's rotors are numbered: `R-{0001}` gives R-0001, R-0002 and so on, with as many
/// digits as the pattern has, or more.
///
/// @param prefix before the number
/// @param first the lowest number
/// @param digits least number of digits
/// @param suffix after the number
record SerialPattern(String prefix, long first, int digits, String suffix) {
  private static final Pattern SHAPE = Pattern.compile("([^{}]*)\\{([0-9]{1,9})}([^{}]*)");

  /// Reads a pattern; anything without exactly one number in braces is wrong input.
  static SerialPattern of(String text) {
    Matcher matcher = SHAPE.matcher(text);
    if (!matcher.matches()) {
      throw Refusal.wrongInput("batch.pattern", text).remedy("lodebook help batch open");
    }
    SerialPattern pattern =
        new SerialPattern(
            matcher.group(1),
            Long.parseLong(matcher.group(2)),
            matcher.group(2).length(),
            matcher.group(3));
    CodeText.check(pattern.serial(pattern.first));
    return pattern;
  }

  /// The serial of a number.
  String serial(long number) {
    return prefix + String.format(Locale.ROOT, "%0" + digits + "d", number) + suffix;
  }

  /// The number to go on with: one above the highest that any number of the shop has after this
  /// pattern, and not below the pattern's own.
  long next(DSLContext sql) {
    String before = CodeText.fold(prefix);
    String after = CodeText.fold(suffix);
    long highest = first - 1;
    for (String code :
        sql.select(CODE.FOLDED)
            .from(CODE)
            .where(CODE.FOLDED.startsWith(before))
            .fetch(CODE.FOLDED)) {
      if (code.length() > before.length() + after.length() && code.endsWith(after)) {
        String number = code.substring(before.length(), code.length() - after.length());
        if (number.matches("[0-9]{1,18}")) {
          highest = Math.max(highest, Long.parseLong(number));
        }
      }
    }
    return highest + 1;
  }
}
