/// The two faces of one book: command line and desktop.
@NullMarked
package lodebook.ui;

import org.jspecify.annotations.NullMarked;
