/// Tests of what the physics means for people.
@NullMarked
package lodebook.assembly.safety;

import org.jspecify.annotations.NullMarked;
