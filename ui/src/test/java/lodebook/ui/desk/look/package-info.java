/// Trying the theme.
@NullMarked
package lodebook.ui.desk.look;

import org.jspecify.annotations.NullMarked;
