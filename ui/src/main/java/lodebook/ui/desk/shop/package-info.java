/// People, meters, the shop's name, backups.
@NullMarked
package lodebook.ui.desk.shop;

import org.jspecify.annotations.NullMarked;
