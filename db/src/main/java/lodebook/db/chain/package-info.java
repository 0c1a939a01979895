/// The chained history: how a line is written as text, and how its hash follows from the line
/// before.
@NullMarked
package lodebook.db.chain;

import org.jspecify.annotations.NullMarked;
