/// Tests of sheets.
@NullMarked
package lodebook.reports.sheet;

import org.jspecify.annotations.NullMarked;
