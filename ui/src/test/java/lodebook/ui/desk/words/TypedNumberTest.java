package lodebook.ui.desk.words;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.OptionalDouble;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/// What counts as a number at the bench.
class TypedNumberTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "12.5;12.5",
        "12,5;12.5",
        "-0,4;-0.4",
        "+3;3",
        "−7.25;-7.25",
        ".5;0.5",
        "12.;12",
        " 8 ;8"
      })
  void commaAndPointBothCount(String text, double number) {
    assertEquals(OptionalDouble.of(number), TypedNumber.of(text));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "mT", "12 mT", "1.234,5", "1,2,3", "--4", "1e3", "NaN"})
  void otherThingsDoNot(String text) {
    assertEquals(OptionalDouble.empty(), TypedNumber.of(text));
  }
}
