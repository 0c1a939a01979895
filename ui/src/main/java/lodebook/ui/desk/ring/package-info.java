/// The ring on the screen: the drawing of the paper, turned, touched and read aloud.
@NullMarked
package lodebook.ui.desk.ring;

import org.jspecify.annotations.NullMarked;
