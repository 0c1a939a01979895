@NullMarked
package lodebook.db.surveys;

import org.jspecify.annotations.NullMarked;
