/// The design of one ring and of a gear: slots, facings, the Halbach rule, probe points, gear
/// models.
@NullMarked
package lodebook.assembly.layout;

import org.jspecify.annotations.NullMarked;
