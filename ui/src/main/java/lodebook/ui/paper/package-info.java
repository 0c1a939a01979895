/// From the book's records to the values of a sheet or picture, for both faces.
@NullMarked
package lodebook.ui.paper;

import org.jspecify.annotations.NullMarked;
