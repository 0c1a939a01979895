/// Who may do what in the shop.
@NullMarked
package lodebook.db.rights;

import org.jspecify.annotations.NullMarked;
