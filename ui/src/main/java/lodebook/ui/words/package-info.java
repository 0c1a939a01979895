/// What both faces say: sentences from the bundle `lodebook.ui.messages`, numbers and facings in
/// words.
@NullMarked
package lodebook.ui.words;

import org.jspecify.annotations.NullMarked;
