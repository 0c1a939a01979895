/// What the physics means for people: pinch, keep-out distances, limits.
@NullMarked
package lodebook.assembly.safety;

import org.jspecify.annotations.NullMarked;
