@NullMarked
package lodebook.db.stock;

import org.jspecify.annotations.NullMarked;
