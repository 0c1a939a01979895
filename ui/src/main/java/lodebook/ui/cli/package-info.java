/// The command line: one thin class for each command, one place that turns failures into sentences.
@NullMarked
package lodebook.ui.cli;

import org.jspecify.annotations.NullMarked;
