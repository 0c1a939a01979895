package lodebook.assembly.layout;

import java.util.List;

/// How the rings of a layout are read.
///
/// @param radiusMetres axis to the probe's sensing element, metres
/// @param heightMetres height of the sensing element above the ring's middle plane towards the
///   marked face, metres
/// @param spots where round the ring, in the order in which they are taken
/// @param components which components at each spot, in the order in which they are taken
public record Probe(
    double radiusMetres, double heightMetres, List<Spot> spots, List<Component> components) {
  public Probe {
    spots = List.copyOf(spots);
    components = List.copyOf(components);
  }
}
