/// Layouts and gear models: drafts that are replaced until they are released, and released
/// revisions that never change.
@NullMarked
package lodebook.db.layouts;

import org.jspecify.annotations.NullMarked;
