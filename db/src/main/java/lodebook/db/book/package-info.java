/// The book itself: where it is, opening it in turn, and the one way in which anything is written.
@NullMarked
package lodebook.db.book;

import org.jspecify.annotations.NullMarked;
