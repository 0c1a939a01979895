/// Rings on the bench: batches, rotors, plans, and what was really put where.
@NullMarked
package lodebook.db.builds;

import org.jspecify.annotations.NullMarked;
