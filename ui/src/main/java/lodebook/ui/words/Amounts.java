package lodebook.ui.words;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.Instant;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import org.jspecify.annotations.Nullable;

/// Quantities as people read them: from SI to the shop's units, with as many digits as mean
/// something.
public final class Amounts {
  private static final DateTimeFormatter MINUTE =
      DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm", Locale.ROOT);

  private Amounts() {}

  /// Flux density in mT with one decimal, without the unit.
  public static String milliTesla(double tesla) {
    return fixed(tesla * 1000, 1);
  }

  /// Flux density in mT with one decimal, or `-` for none.
  public static String milliTeslaOrDash(@Nullable Double tesla) {
    return tesla == null ? "-" : milliTesla(tesla);
  }

  /// A length in mm without needless zeros, without the unit.
  public static String millimetres(double metres) {
    return plain(metres * 1000);
  }

  /// A share in per cent without needless zeros, without the sign.
  public static String percent(double share) {
    return plain(share * 100);
  }

  /// An angle in degrees without needless zeros, without the sign.
  public static String degrees(double degrees) {
    return plain(degrees);
  }

  /// A number with some decimals.
  public static String fixed(double number, int decimals) {
    BigDecimal rounded = new BigDecimal(number).setScale(decimals, RoundingMode.HALF_EVEN);
    return (rounded.signum() == 0 ? rounded.abs() : rounded).toPlainString();
  }

  /// A number with up to four decimals.
  public static String plain(double number) {
    String fixed = fixed(number, 4);
    return fixed.replaceFirst("\\.?0+$", "");
  }

  /// A time to the minute in a zone.
  public static String minute(Instant time, ZoneId zone) {
    return MINUTE.format(time.atZone(zone));
  }
}
