/// Keeping a book: making it, looking after it, carrying it elsewhere, proving that it is whole.
@NullMarked
package lodebook.db.keep;

import org.jspecify.annotations.NullMarked;
