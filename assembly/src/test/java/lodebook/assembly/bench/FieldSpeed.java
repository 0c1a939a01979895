package lodebook.assembly.bench;

import java.io.PrintStream;
import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;

/// Runs [FieldBenchmark] and prints its figures as ratios.
public final class FieldSpeed {
  private FieldSpeed() {}

  /// Takes no arguments.
  public static void main(String[] arguments) throws RunnerException {
    Map<String, Double> micros = new HashMap<>();
    for (RunResult result :
        new Runner(new OptionsBuilder().include(FieldBenchmark.class.getName()).build()).run()) {
      micros.put(result.getPrimaryResult().getLabel(), result.getPrimaryResult().getScore());
    }
    print(System.out, micros);
  }

  private static void print(PrintStream to, Map<String, Double> micros) {
    double closedForm = micros.getOrDefault("functionsOfTheClosedForm", Double.NaN);
    for (String place : new String[] {"AtMidHeight", "AboveMidHeight"}) {
      double field = micros.getOrDefault("field" + place, Double.NaN);
      double left = micros.getOrDefault("functionsLeft" + place, Double.NaN);
      to.printf(
          Locale.ROOT,
          "%s: field %.0f µs, functions left %.0f µs (ratio %.2f), all functions of the closed form"
              + " %.0f µs (ratio %.2f)%n",
          place,
          field,
          left,
          field / left,
          closedForm,
          field / closedForm);
    }
  }
}
