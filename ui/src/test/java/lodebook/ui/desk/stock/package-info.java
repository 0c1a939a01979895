/// Trying the stockroom.
@NullMarked
package lodebook.ui.desk.stock;

import org.jspecify.annotations.NullMarked;
