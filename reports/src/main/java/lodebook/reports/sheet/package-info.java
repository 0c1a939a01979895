/// Pages with head and foot, flowing text, tables that break well, archival PDF.
@NullMarked
package lodebook.reports.sheet;

import org.jspecify.annotations.NullMarked;
