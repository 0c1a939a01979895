/// Trying the ring on the screen.
@NullMarked
package lodebook.ui.desk.ring;

import org.jspecify.annotations.NullMarked;
