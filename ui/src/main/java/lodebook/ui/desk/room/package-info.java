/// What a room of the desktop is, and the doors between rooms.
@NullMarked
package lodebook.ui.desk.room;

import org.jspecify.annotations.NullMarked;
