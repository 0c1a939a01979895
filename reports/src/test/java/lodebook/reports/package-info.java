/// Tests of paper and pictures.
@NullMarked
package lodebook.reports;

import org.jspecify.annotations.NullMarked;
