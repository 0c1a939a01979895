/// The people of the shop and what they may do.
@NullMarked
package lodebook.db.people;

import org.jspecify.annotations.NullMarked;
