/// The instruments of the shop and their calibrations.
@NullMarked
package lodebook.db.meters;

import org.jspecify.annotations.NullMarked;
