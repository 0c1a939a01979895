/// Looking at the history.
@NullMarked
package lodebook.db.history;

import org.jspecify.annotations.NullMarked;
