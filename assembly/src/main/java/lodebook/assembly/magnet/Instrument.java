package lodebook.assembly.magnet;

/// How well a gaussmeter reads; every number is a standard deviation.
///
/// @param code the shop's number for the meter, empty where nobody noted it
/// @param accuracy relative gain error that all its readings share (0.01 is 1 %)
/// @param floorTesla error of its own that each reading has besides, tesla
public record Instrument(String code, double accuracy, double floorTesla) {
  /// What is assumed where no meter is named: 1 %.
  public static final Instrument UNNAMED = new Instrument("", 0.01, 0);
}
