/// What the book answers when it does not do a thing: a key, its arguments and the command that
/// helps. The sentences stand in the bundle `lodebook.db.messages`.
@NullMarked
package lodebook.db.refusal;

import org.jspecify.annotations.NullMarked;
