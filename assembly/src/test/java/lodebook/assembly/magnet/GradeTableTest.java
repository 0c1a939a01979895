package lodebook.assembly.magnet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.Objects;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/// Trade: makers' tables as recalled.
class GradeTableTest {
  private static final Map<String, Grade> GRADES =
      GradeTable.all().stream().collect(Collectors.toMap(Grade::name, Function.identity()));

  @ParameterizedTest
  @CsvSource({
    "N35, 1.17, 1.22, 80",
    "N38, 1.22, 1.26, 80",
    "N40, 1.25, 1.29, 80",
    "N42, 1.28, 1.32, 80",
    "N45, 1.32, 1.37, 80",
    "N48, 1.37, 1.41, 80",
    "N50, 1.39, 1.45, 70",
    "N52, 1.42, 1.48, 70",
    "N50M, 1.39, 1.45, 90",
    "N50H, 1.39, 1.45, 110",
    "N42M, 1.28, 1.32, 100",
    "N42H, 1.28, 1.32, 120",
    "N42SH, 1.28, 1.32, 150",
    "N42UH, 1.28, 1.32, 180",
    "N42EH, 1.28, 1.32, 200",
    "N38AH, 1.22, 1.26, 220",
    "SmCo, 0.78, 1.18, 150",
    "Ferrite, 0.37, 0.43, 250"
  })
  void remanenceAndTemperature(String name, double low, double high, double celsius) {
    Grade grade = Objects.requireNonNull(GRADES.get(name), name);
    assertEquals(low, grade.remanenceLowTesla());
    assertEquals(high, grade.remanenceHighTesla());
    assertEquals(celsius, grade.highestTemperatureCelsius());
  }

  /// ASTM A1101-16: sintered NdFeB has a remanence from 1.08 to 1.5 T.
  @Test
  void neodymiumStaysWithinTheStandardsBounds() {
    for (Grade grade : GRADES.values()) {
      if (grade.name().startsWith("N")) {
        assertTrue(
            grade.remanenceLowTesla() >= 1.08 && grade.remanenceHighTesla() <= 1.5, grade.name());
        assertEquals(-0.0012, grade.remanencePerKelvin());
        assertEquals(1.05, grade.recoilPermeability());
        assertEquals(7500, grade.densityKilogramPerCubicMetre());
      }
    }
  }
}
