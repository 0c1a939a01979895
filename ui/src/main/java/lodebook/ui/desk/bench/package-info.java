/// One rotor, one step: build, read, be told at once.
@NullMarked
package lodebook.ui.desk.bench;

import org.jspecify.annotations.NullMarked;
