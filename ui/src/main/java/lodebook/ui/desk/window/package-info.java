/// The window: rooms in the order of the day, one search field, a foot.
@NullMarked
package lodebook.ui.desk.window;

import org.jspecify.annotations.NullMarked;
