package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.ProbePoint;
import org.hipparchus.special.Erf;
import org.jspecify.annotations.Nullable;

/// Several surveys of the same ring, by different people or meters, explained together.
///
/// Each is first freed of the slip that explains it alone. Where two of them read the same place,
/// they must agree but for what each has alone: the probe's place and tilt, the meter's gain and
/// floor. If they do not, at a probability below 1 in 10 000 for all places together or for the
/// worst of them, the places that differ most are named. Meters need different names in different
/// surveys, since each survey has its own gain error.
public final class RepeatedSurveys {
  private static final double FEWEST_DEVIATIONS = 3.5;
  private static final int MOST_NAMED = 6;

  private final SurveyedRing ring;
  private final Priors priors;
  private final ProbeResponses responses;

  /// @param ring the ring as it stood for all of them
  /// @param priors what is believed before the first reading
  /// @param responses of the same design, perhaps shared with other rings
  public RepeatedSurveys(SurveyedRing ring, Priors priors, ProbeResponses responses) {
    this.ring = ring;
    this.priors = priors;
    this.responses = responses;
  }

  private record Taken(String survey, Reading reading) {}

  /// Explains them together.
  ///
  /// @param surveys the readings of each by its name
  public Diagnosis explain(Map<String, List<Reading>> surveys) {
    SurveyExplainer explainer = new SurveyExplainer(ring, priors, responses);
    List<Taken> all = new ArrayList<>();
    List<Measuring> slipped = new ArrayList<>();
    surveys.forEach(
        (name, readings) -> {
          @Nullable Account alone = explainer.account(readings, null);
          Slip slip = alone == null ? Slip.NONE : alone.slip();
          if (!slip.measuring().asSet()) {
            slipped.add(slip.measuring());
          }
          readings.forEach(reading -> all.add(new Taken(name, freed(reading, slip))));
        });
    List<Reading> together = all.stream().map(Taken::reading).toList();
    @Nullable Account account = explainer.account(together, null);
    if (account == null) {
      return SurveyExplainer.NOTHING_READ;
    }
    Diagnosis diagnosis = explainer.diagnosis(together, account);
    List<Disagreement> where = disagreements(all, account);
    Diagnosis said = where.isEmpty() ? diagnosis : diagnosis.disagreeing(where);
    return slipped.isEmpty() || !said.measuring().asSet()
        ? said
        : said.measured(slipped.getFirst());
  }

  private Reading freed(Reading reading, Slip slip) {
    ProbePoint real = slip.realPoint(reading, ring.layout());
    return new Reading(
        real.slot(),
        real.spot(),
        real.component(),
        reading.fluxTesla() * slip.freeing(reading.component()),
        reading.unit(),
        reading.temperatureCelsius(),
        reading.radiusMetres(),
        reading.heightMetres(),
        reading.meter(),
        reading.filled());
  }

  /// Two rows at the same place in different surveys.
  private record Two(int first, int second) {}

  private List<Disagreement> disagreements(List<Taken> all, Account account) {
    List<Two> twos = samePlaces(all, account.rows().rows());
    if (twos.isEmpty()) {
      return List.of();
    }
    double[][] rows = account.rows().covariance(account.best().explanation().ofMagnets());
    double[] difference = new double[twos.size()];
    double[][] covariance = new double[twos.size()][twos.size()];
    double[] sd = new double[twos.size()];
    for (int a = 0; a < difference.length; a++) {
      Two one = twos.get(a);
      difference[a] = account.rows().read()[one.first()] - account.rows().read()[one.second()];
      for (int b = a; b < difference.length; b++) {
        Two other = twos.get(b);
        covariance[a][b] =
            at(rows, one.first(), other.first())
                - at(rows, one.first(), other.second())
                - at(rows, one.second(), other.first())
                + at(rows, one.second(), other.second());
      }
      sd[a] = Math.sqrt(covariance[a][a]);
    }
    double[] white = new Cholesky(covariance).whiten(difference);
    List<Integer> far = new ArrayList<>();
    for (int a = 0; a < difference.length; a++) {
      far.add(a);
    }
    far.sort(Comparator.comparingDouble(a -> -Math.abs(difference[a]) / sd[a]));
    double worst = Math.abs(difference[far.getFirst()]) / sd[far.getFirst()];
    double byWorst = difference.length * Erf.erfc(worst / Math.sqrt(2));
    double byAll = Judge.fit(Judge.dot(white, white), white.length);
    if (Math.min(byWorst, byAll) >= Account.LEAST_FIT) {
      return List.of();
    }
    return far.stream()
        .filter(
            a -> a.equals(far.getFirst()) || Math.abs(difference[a]) > FEWEST_DEVIATIONS * sd[a])
        .limit(MOST_NAMED)
        .map(a -> disagreement(all, account.rows(), twos.get(a), 2 * sd[a]))
        .toList();
  }

  private static double at(double[][] upper, int row, int column) {
    return upper[Math.min(row, column)][Math.max(row, column)];
  }

  private static Disagreement disagreement(
      List<Taken> all, RowModel rows, Two two, double bandTesla) {
    return new Disagreement(
        rows.rows().get(two.first()).point(),
        List.of(all.get(two.first()).survey(), all.get(two.second()).survey()),
        List.of(rows.read()[two.first()], rows.read()[two.second()]),
        bandTesla);
  }

  /// The first row of each place and survey beside the first of the place in any survey.
  private static List<Two> samePlaces(List<Taken> all, List<Row> rows) {
    Map<List<Object>, Map<String, Integer>> places = new LinkedHashMap<>();
    for (int i = 0; i < rows.size(); i++) {
      Row row = rows.get(i);
      places
          .computeIfAbsent(
              List.of(row.point(), row.radiusMetres(), row.heightMetres()),
              place -> new LinkedHashMap<>())
          .putIfAbsent(all.get(i).survey(), i);
    }
    List<Two> twos = new ArrayList<>();
    for (Map<String, Integer> bySurvey : places.values()) {
      List<Integer> at = List.copyOf(bySurvey.values());
      for (int n = 1; n < at.size(); n++) {
        twos.add(new Two(at.getFirst(), at.get(n)));
      }
    }
    return twos;
  }
}
