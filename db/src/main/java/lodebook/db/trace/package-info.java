/// From any number of the shop to what the thing was made from and what it went into.
@NullMarked
package lodebook.db.trace;

import org.jspecify.annotations.NullMarked;
