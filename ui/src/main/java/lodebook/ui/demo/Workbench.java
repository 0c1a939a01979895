package lodebook.ui.demo;

import java.util.List;
import lodebook.assembly.layout.RingDesign;

/// What the practice gauge must know of the demo's book to read a ring.
public interface Workbench {
  /// The design that a rotor is built to.
  RingDesign design(String rotor);

  /// Remanences of measured pieces, tesla at 20 °C, in the order of their names.
  ///
  /// @param pieces names such as `L-2404/0017`
  double[] remanencesTesla(List<String> pieces);
}
