/// Physical gears: which rotors are in them, from when to when, and what became of them.
@NullMarked
package lodebook.db.units;

import org.jspecify.annotations.NullMarked;
