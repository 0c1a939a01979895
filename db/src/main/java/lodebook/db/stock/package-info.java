/// The magnets in the shop: grades, types, lots, pieces, their readings and where they lie.
@NullMarked
package lodebook.db.stock;

import org.jspecify.annotations.NullMarked;
