/// Flux density of magnets and of whole rings, harmonics, forces: the physics, with no shop words.
@NullMarked
package lodebook.assembly.field;

import org.jspecify.annotations.NullMarked;
