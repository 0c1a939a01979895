/// Tests of the ring's picture.
@NullMarked
package lodebook.reports.ring;

import org.jspecify.annotations.NullMarked;
