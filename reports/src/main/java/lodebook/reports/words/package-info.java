/// Words of the sheets in the reader's language, written once.
@NullMarked
package lodebook.reports.words;

import org.jspecify.annotations.NullMarked;
