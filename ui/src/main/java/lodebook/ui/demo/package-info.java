/// The main job walked once on a book of an invented workshop.
@NullMarked
package lodebook.ui.demo;

import org.jspecify.annotations.NullMarked;
