/// What waits, and the way to where it is dealt with.
@NullMarked
package lodebook.ui.desk.waiting;

import org.jspecify.annotations.NullMarked;
