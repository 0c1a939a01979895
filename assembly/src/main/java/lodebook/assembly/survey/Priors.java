package lodebook.assembly.survey;

import java.util.LinkedHashMap;
import java.util.Map;

/// What is believed before the first reading. Each is a probability.
///
/// @param reversed per placed magnet, that it is reversed
/// @param furtherReversed per placed magnet, that it is reversed too where another one is: the same
///   hand, tray or mistake, so reversals come in company
/// @param quarterTurn per placed magnet and way, that it is turned by a quarter
/// @param turned per placed magnet that can stand at any angle, that it is turned by another angle
/// @param missing per placed magnet, that it is not there
/// @param weak per placed magnet, that it has lost more than a tenth of its strength
/// @param strong per placed magnet, that it has over a tenth more than recorded
/// @param wildReading per reading, that it belongs to nothing (a typing error)
/// @param signInverted per survey, that all signs are inverted
/// @param otherStart per survey, that the person began at another slot; the probability falls with
///   the square of the distance
/// @param opposite per survey, that the person went the other way round
/// @param unitSlip per survey, that one unit was written for another
/// @param wholeRing per survey, that all readings are off together by more than the meter's
///   accuracy
public record Priors(
    double reversed,
    double furtherReversed,
    double quarterTurn,
    double turned,
    double missing,
    double weak,
    double strong,
    double wildReading,
    double signInverted,
    double otherStart,
    double opposite,
    double unitSlip,
    double wholeRing) {
  /// What holds where a shop states nothing else (this project's choice, see
  /// docs/decisions/survey-model.md).
  public static final Priors DEFAULT =
      new Priors(
          0.02, 0.1, 0.002, 0.002, 0.001, 0.004, 0.00003, 0.0015, 0.05, 0.01, 0.02, 0.02, 0.005);

  /// The priors by the names under which a shop settles them, in their own order.
  public Map<String, Double> byName() {
    Map<String, Double> names = new LinkedHashMap<>();
    names.put("prior-reversed", reversed);
    names.put("prior-further-reversed", furtherReversed);
    names.put("prior-quarter-turn", quarterTurn);
    names.put("prior-turned", turned);
    names.put("prior-missing", missing);
    names.put("prior-weak", weak);
    names.put("prior-strong", strong);
    names.put("prior-wild-reading", wildReading);
    names.put("prior-sign-inverted", signInverted);
    names.put("prior-other-start", otherStart);
    names.put("prior-opposite", opposite);
    names.put("prior-unit-slip", unitSlip);
    names.put("prior-whole-ring", wholeRing);
    return names;
  }

  /// The same with some of them settled otherwise, by the names of [#byName()]; other names are
  /// passed over.
  public Priors with(Map<String, Double> settled) {
    Map<String, Double> all = byName();
    double[] values =
        all.entrySet().stream()
            .mapToDouble(each -> settled.getOrDefault(each.getKey(), each.getValue()))
            .toArray();
    return new Priors(
        values[0],
        values[1],
        values[2],
        values[3],
        values[4],
        values[5],
        values[6],
        values[7],
        values[8],
        values[9],
        values[10],
        values[11],
        values[12]);
  }
}
