/// Lots, pieces and trays.
@NullMarked
package lodebook.ui.desk.stock;

import org.jspecify.annotations.NullMarked;
