/// Trying the window.
@NullMarked
package lodebook.ui.desk.window;

import org.jspecify.annotations.NullMarked;
