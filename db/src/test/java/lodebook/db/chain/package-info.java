@NullMarked
package lodebook.db.chain;

import org.jspecify.annotations.NullMarked;
