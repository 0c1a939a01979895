/// Trying the desktop's sentences.
@NullMarked
package lodebook.ui.desk.words;

import org.jspecify.annotations.NullMarked;
