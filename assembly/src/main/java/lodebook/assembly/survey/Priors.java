package lodebook.assembly.survey;

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
}
