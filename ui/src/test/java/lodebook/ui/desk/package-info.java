/// Trying the desktop: without a window where its state is concerned, on the headless platform
/// where real controls are.
@NullMarked
package lodebook.ui.desk;

import org.jspecify.annotations.NullMarked;
