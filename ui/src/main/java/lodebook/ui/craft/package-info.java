/// Jobs in which the book and the craft take turns, for both faces: read what is needed, compute
/// with the book closed, store what came out.
@NullMarked
package lodebook.ui.craft;

import org.jspecify.annotations.NullMarked;
