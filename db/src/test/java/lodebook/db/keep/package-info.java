@NullMarked
package lodebook.db.keep;

import org.jspecify.annotations.NullMarked;
