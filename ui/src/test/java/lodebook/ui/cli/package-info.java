/// Tests of the command line through its one entry.
@NullMarked
package lodebook.ui.cli;

import org.jspecify.annotations.NullMarked;
