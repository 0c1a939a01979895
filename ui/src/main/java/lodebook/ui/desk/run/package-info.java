/// The one place that leaves the screen's thread, and where failures become sentences.
@NullMarked
package lodebook.ui.desk.run;

import org.jspecify.annotations.NullMarked;
