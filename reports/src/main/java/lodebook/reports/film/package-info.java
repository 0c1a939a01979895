/// What a viewing film shows on a ring, and the flux round its circle.
@NullMarked
package lodebook.reports.film;

import org.jspecify.annotations.NullMarked;
