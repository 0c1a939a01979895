/// The program as whole processes: killed at any moment, racing for one book, kept waiting, fed
/// with bad files.
@NullMarked
package lodebook.ui.process;

import org.jspecify.annotations.NullMarked;
