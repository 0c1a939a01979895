@NullMarked
package lodebook.db.book;

import org.jspecify.annotations.NullMarked;
