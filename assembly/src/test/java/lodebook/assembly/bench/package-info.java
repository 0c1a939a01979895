/// Measurements of speed, run by hand; docs/performance.md has the commands.
@NullMarked
package lodebook.assembly.bench;

import org.jspecify.annotations.NullMarked;
