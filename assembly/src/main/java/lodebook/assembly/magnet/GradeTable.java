package lodebook.assembly.magnet;

import java.util.ArrayList;
import java.util.List;

/// The grades a new book knows.
///
/// Sintered NdFeB, remanence and highest temperature: trade, recalled from makers' tables, whose
/// ranges differ by 0.01 to 0.02 T; inside the bounds of ASTM A1101-16 (1.08 to 1.5 T). The letters
/// after the number (M, H, SH, UH, EH, AH) stand for the highest working temperature; where makers
/// differ, the lowest figure is taken. SmCo: remanence from ASTM A1102-16's bounds, the rest trade.
/// Hard ferrite: trade.
public final class GradeTable {
  private static final String TRADE = "trade, makers' tables recalled; within ASTM A1101-16";

  private record Family(int number, double low, double high) {}

  /// A letter, its temperature, and the highest number it is sold with.
  private record Suffix(String letters, double temperatureCelsius, int highestNumber) {}

  private static final List<Family> FAMILIES =
      List.of(
          new Family(35, 1.17, 1.22),
          new Family(38, 1.22, 1.26),
          new Family(40, 1.25, 1.29),
          new Family(42, 1.28, 1.32),
          new Family(45, 1.32, 1.37),
          new Family(48, 1.37, 1.41),
          new Family(50, 1.39, 1.45),
          new Family(52, 1.42, 1.48));

  private static final List<Suffix> SUFFIXES =
      List.of(
          new Suffix("", 80, 52),
          new Suffix("M", 100, 52),
          new Suffix("H", 120, 50),
          new Suffix("SH", 150, 50),
          new Suffix("UH", 180, 45),
          new Suffix("EH", 200, 42),
          new Suffix("AH", 220, 38));

  private GradeTable() {}

  /// All grades of the table, by number and then by rising temperature; SmCo and ferrite last.
  public static List<Grade> all() {
    List<Grade> grades = new ArrayList<>();
    for (Family family : FAMILIES) {
      for (Suffix suffix : SUFFIXES) {
        if (family.number() <= suffix.highestNumber()) {
          grades.add(neodymium(family, suffix));
        }
      }
    }
    grades.add(
        new Grade(
            "SmCo",
            0.78,
            1.18,
            -0.0004,
            1.05,
            150,
            8300,
            "ASTM A1102-16 (remanence); trade, recalled (the rest)"));
    grades.add(
        new Grade(
            "Ferrite", 0.37, 0.43, -0.002, 1.05, 250, 4900, "trade, makers' tables recalled"));
    return List.copyOf(grades);
  }

  private static Grade neodymium(Family family, Suffix suffix) {
    return new Grade(
        "N" + family.number() + suffix.letters(),
        family.low(),
        family.high(),
        -0.0012,
        1.05,
        highestTemperature(family.number(), suffix),
        7500,
        TRADE);
  }

  /// The strongest numbers stand less heat than their letters say.
  private static double highestTemperature(int number, Suffix suffix) {
    boolean strongest = number >= 50 && suffix.highestNumber() >= 50;
    return strongest && !suffix.letters().equals("SH")
        ? suffix.temperatureCelsius() - 10
        : suffix.temperatureCelsius();
  }
}
