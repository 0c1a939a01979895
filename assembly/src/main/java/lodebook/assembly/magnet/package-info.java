/// What a magnet is: shapes, grades, remanence and its uncertainty, temperature.
@NullMarked
package lodebook.assembly.magnet;

import org.jspecify.annotations.NullMarked;
