/// Paper and pictures: values in, bytes out; no query and no clock.
@NullMarked
package lodebook.reports;

import org.jspecify.annotations.NullMarked;
