/// What the desktop says, in English and German, with numbers and times as the system has them.
@NullMarked
package lodebook.ui.desk.words;

import org.jspecify.annotations.NullMarked;
