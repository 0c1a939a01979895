/// The computer at which somebody stands: its book, its clock, who is at it, and what others change
/// meanwhile.
@NullMarked
package lodebook.ui.desk.station;

import org.jspecify.annotations.NullMarked;
