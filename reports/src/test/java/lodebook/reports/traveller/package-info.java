/// Tests of the traveller.
@NullMarked
package lodebook.reports.traveller;

import org.jspecify.annotations.NullMarked;
