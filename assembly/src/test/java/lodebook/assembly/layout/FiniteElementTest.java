package lodebook.assembly.layout;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/// A long ring of blocks, solved in two dimensions by FreeFem++ (input, version and command in
/// long-ring.edp and at the head of long-ring.csv), against blocks of 20 m length.
class FiniteElementTest {
  private static final RingPolarisation RIGID = polarisation(1.0);
  private static final RingPolarisation SOFT = polarisation(1.05);

  /// 1 % of the greatest reading, 0.439 T.
  private static final double TOLERANCE = 0.00439;

  private static RingDesign ring(double recoilPermeability) {
    return new RingDesign(
        Rings.layout(4, 4, Focus.IN, 20, 16), Rings.block(5, 5, 20000, recoilPermeability), null);
  }

  private static RingPolarisation polarisation(double recoilPermeability) {
    RingDesign ring = ring(recoilPermeability);
    return MutualMagnetisation.of(ring).answerTo(Rings.equal(ring.ruleFacings(), 1.3));
  }

  @ParameterizedTest
  @CsvFileSource(resources = "long-ring.csv", numLinesToSkip = 1)
  void longRingAgrees(
      double degrees, double radial, double tangential, double radialSoft, double tangentialSoft) {
    RingField field = new RingField(ring(1.0));
    double angle = Math.toRadians(degrees);
    List<ReadingPlace> places =
        List.of(
            new ReadingPlace(0.016, angle, 0, Component.RADIAL),
            new ReadingPlace(0.016, angle, 0, Component.TANGENTIAL));
    FieldMatrix matrix = field.at(places);
    double[] rigid = matrix.apply(RIGID);
    double[] soft = matrix.apply(SOFT);
    assertEquals(radial, rigid[0], TOLERANCE);
    assertEquals(tangential, rigid[1], TOLERANCE);
    assertEquals(radialSoft, soft[0], TOLERANCE);
    assertEquals(tangentialSoft, soft[1], TOLERANCE);
  }
}
