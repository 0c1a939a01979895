/// reports
@NullMarked
package lodebook.reports;

import org.jspecify.annotations.NullMarked;
