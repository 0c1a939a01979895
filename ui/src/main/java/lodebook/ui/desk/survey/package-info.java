/// A full round of readings and what it shows.
@NullMarked
package lodebook.ui.desk.survey;

import org.jspecify.annotations.NullMarked;
