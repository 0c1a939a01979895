package lodebook.assembly.survey;

/// The instrument behind a reading. Both numbers are standard deviations.
///
/// @param name the shop's number for the meter; readings with the same name share one gain error
/// @param accuracy relative gain error, common to all readings of one survey with this meter (0.01
///   is 1 %)
/// @param floorTesla error that is independent for each reading, tesla
public record Meter(String name, double accuracy, double floorTesla) {
  public Meter {
    if (!(accuracy >= 0) || !(floorTesla >= 0)) {
      throw new IllegalArgumentException(
          "meter "
              + name
              + ": accuracy "
              + accuracy
              + " and floor "
              + floorTesla
              + " T must not be negative");
    }
  }
}
