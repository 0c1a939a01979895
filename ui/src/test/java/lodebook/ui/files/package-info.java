/// Tests of the readers and writers of files.
@NullMarked
package lodebook.ui.files;

import org.jspecify.annotations.NullMarked;
