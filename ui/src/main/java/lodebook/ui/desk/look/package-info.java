/// The one theme: colours by what they are for, in light, in dark and in high contrast.
@NullMarked
package lodebook.ui.desk.look;

import org.jspecify.annotations.NullMarked;
