package lodebook.db.stock;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import lodebook.assembly.magnet.Grade;

/// The grades that a new book knows.
///
/// Remanence and highest temperature of sintered NdFeB: trade, recalled from makers' tables, which
/// differ by 0.01 to 0.02 T between makers; the lower of their temperatures. Samarium cobalt:
/// bounds of ASTM A1102-16; hard ferrite: trade. Densities of these two: trade, from memory.
public final class UsualGrades {
  private static final String TRADE = "trade, makers' tables; makers differ by 0.01 to 0.02 T";

  private record Remanence(String name, double low, double high) {}

  private static final List<Remanence> NEODYMIUM =
      List.of(
          new Remanence("N35", 1.17, 1.22),
          new Remanence("N38", 1.22, 1.26),
          new Remanence("N40", 1.25, 1.29),
          new Remanence("N42", 1.28, 1.32),
          new Remanence("N45", 1.32, 1.37),
          new Remanence("N48", 1.37, 1.41),
          new Remanence("N50", 1.39, 1.45),
          new Remanence("N52", 1.42, 1.48));

  /// Highest temperature by what follows the number.
  private static final Map<String, Double> SUFFIXES =
      Map.of("", 80.0, "M", 100.0, "H", 120.0, "SH", 150.0);

  /// Where a grade differs from its suffix.
  private static final Map<String, Double> LOWER =
      Map.of("N50", 70.0, "N52", 70.0, "N50M", 90.0, "N50H", 110.0);

  private UsualGrades() {}

  /// The grades, weakest first.
  public static List<Grade> all() {
    List<Grade> grades = new ArrayList<>();
    for (Remanence remanence : NEODYMIUM) {
      for (String suffix : List.of("", "M", "H", "SH")) {
        String name = remanence.name() + suffix;
        if (isMade(remanence.name(), suffix)) {
          double highest = LOWER.getOrDefault(name, SUFFIXES.getOrDefault(suffix, 80.0));
          grades.add(
              new Grade(
                  name, remanence.low(), remanence.high(), -0.0012, 1.05, highest, 7500, TRADE));
        }
      }
    }
    grades.add(
        new Grade("SmCo", 0.78, 1.18, -0.0004, 1.05, 150, 8300, "ASTM A1102-16; rest trade"));
    grades.add(new Grade("ferrite", 0.37, 0.43, -0.002, 1.1, 250, 4900, "trade"));
    return grades;
  }

  private static boolean isMade(String name, String suffix) {
    return switch (name) {
      case "N52" -> suffix.isEmpty();
      case "N50" -> !suffix.equals("SH");
      default -> true;
    };
  }
}
