/// The one space of numbers that lots, layouts, gear models, batches, rotors, units, parts, trays,
/// shipments, meters and surveys share.
@NullMarked
package lodebook.db.code;

import org.jspecify.annotations.NullMarked;
