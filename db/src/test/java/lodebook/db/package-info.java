@NullMarked
package lodebook.db;

import org.jspecify.annotations.NullMarked;
