@NullMarked
package lodebook.db.layouts;

import org.jspecify.annotations.NullMarked;
