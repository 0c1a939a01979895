/// Who did what and when.
@NullMarked
package lodebook.ui.desk.history;

import org.jspecify.annotations.NullMarked;
