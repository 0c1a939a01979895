/// Drawing in millimetres, the same calls for paper, pixels and vector files; lettering in one
/// embedded typeface.
@NullMarked
package lodebook.reports.canvas;

import org.jspecify.annotations.NullMarked;
