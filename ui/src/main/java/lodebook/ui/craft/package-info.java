/// Where the book asks the craft: adapters between the operations of the book and the computations
/// of assembly, for both faces.
@NullMarked
package lodebook.ui.craft;

import org.jspecify.annotations.NullMarked;
