@NullMarked
package lodebook.db.people;

import org.jspecify.annotations.NullMarked;
