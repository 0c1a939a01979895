@NullMarked
package lodebook.db.builds;

import org.jspecify.annotations.NullMarked;
