/// Trying the bench.
@NullMarked
package lodebook.ui.desk.bench;

import org.jspecify.annotations.NullMarked;
