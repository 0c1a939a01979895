/// Tests of lettering and canvases.
@NullMarked
package lodebook.reports.canvas;

import org.jspecify.annotations.NullMarked;
