@NullMarked
package lodebook.db.units;

import org.jspecify.annotations.NullMarked;
