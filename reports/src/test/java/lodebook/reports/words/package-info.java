/// Tests of the sheets' words.
@NullMarked
package lodebook.reports.words;

import org.jspecify.annotations.NullMarked;
