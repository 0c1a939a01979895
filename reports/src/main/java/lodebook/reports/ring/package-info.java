/// The picture of a ring: slots in place, magnets with their arrows, readings round it.
@NullMarked
package lodebook.reports.ring;

import org.jspecify.annotations.NullMarked;
