/// Readers and writers of the shop's files, for both faces: no screen, no database.
///
/// A reader lists everything that is wrong in a file at once ([BadFile]) or hands over all its
/// rows.
@NullMarked
package lodebook.ui.files;

import org.jspecify.annotations.NullMarked;
