package lodebook.reports.traveller;

import java.util.List;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.safety.HandlingFigures;
import lodebook.reports.sheet.SheetFacts;
import org.jspecify.annotations.Nullable;

/// Everything that the traveller of a rotor says.
///
/// @param facts what the sheet says about itself; its code is the rotor's number
/// @param layout the ring's design
/// @param type its magnet type
/// @param sideType the type of magnets lying along the ring, or null where it is the same
/// @param batch the batch's number, or null for a rotor of no batch
/// @param gear the gear model with its revision, such as "GEAR-1 rev A", or null
/// @param steps the magnets in the order of this list
/// @param inFillingOrder whether the order is a planned order of filling; else it is that of slots
/// @param planned sentences about the plan in the sheet's language: the order of filling, its
///   figures, what the latest survey showed
/// @param finished readings of the finished ring, taken after the last step; empty where the steps'
///   own readings are those of the finished ring
/// @param handling figures for the notices
public record Traveller(
    SheetFacts facts,
    Layout layout,
    MagnetType type,
    @Nullable MagnetType sideType,
    @Nullable String batch,
    @Nullable String gear,
    List<Step> steps,
    boolean inFillingOrder,
    List<String> planned,
    List<ExpectedReading> finished,
    HandlingFigures handling) {
  public Traveller {
    steps = List.copyOf(steps);
    planned = List.copyOf(planned);
    finished = List.copyOf(finished);
  }
}
