package lodebook.ui.paper;

import java.time.OffsetDateTime;
import java.util.Locale;
import lodebook.db.keep.BookInfo;
import lodebook.reports.sheet.PaperSize;
import lodebook.reports.sheet.SheetFacts;

/// What every sheet of this book says about itself.
///
/// @param info the book as it is now
/// @param printedBy who prints
/// @param printedAt when
/// @param paper size of the paper
/// @param language language of the sheet
public record Facts(
    BookInfo info, String printedBy, OffsetDateTime printedAt, PaperSize paper, Locale language) {
  /// The facts of one sheet.
  ///
  /// @param code the number of what it is about
  /// @param shows what it shows, with its revision
  public SheetFacts of(String code, String shows) {
    return new SheetFacts(
        code,
        shows,
        info.name(),
        printedBy,
        printedAt,
        info.head().sequence(),
        info.head().digits(),
        1,
        paper,
        language);
  }
}
