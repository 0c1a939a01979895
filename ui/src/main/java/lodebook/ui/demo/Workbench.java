package lodebook.ui.demo;

import lodebook.assembly.layout.RingDesign;

/// What the practice gauge must know of the demo's book to read a ring.
public interface Workbench {
  /// The design that a rotor is built to.
  RingDesign design(String rotor);

  /// Remanence of a measured piece, tesla at 20 °C.
  ///
  /// @param piece its name, `LOT/NUMBER`
  double remanenceTesla(String piece);
}
