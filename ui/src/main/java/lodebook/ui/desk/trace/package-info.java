/// Where a thing came from and where it went.
@NullMarked
package lodebook.ui.desk.trace;

import org.jspecify.annotations.NullMarked;
