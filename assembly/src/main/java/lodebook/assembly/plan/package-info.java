/// Which piece goes into which slot, which way it faces, and which slots are filled first.
///
/// Everything here is repeatable: the same task, seed and effort give the same plan, as long as the
/// caller's clock does not cut it short.
@NullMarked
package lodebook.assembly.plan;

import org.jspecify.annotations.NullMarked;
