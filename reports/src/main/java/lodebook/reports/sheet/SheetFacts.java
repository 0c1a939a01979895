package lodebook.reports.sheet;

import java.time.OffsetDateTime;
import java.util.Locale;

/// What every sheet says about itself.
///
/// @param code the number of what the sheet is about, such as the rotor's
/// @param shows what it shows, with its revision, such as "STIR-IN rev A"
/// @param book the book's name
/// @param printedBy who printed it
/// @param printedAt when; the file's dates are set from it
/// @param historyNumber number of the last line of the book's history at that time
/// @param historyHead first eight hex digits of that line's chain value
/// @param copy 1 for the first print, 2 for the second …
/// @param paper size of the paper
/// @param language language of its words
public record SheetFacts(
    String code,
    String shows,
    String book,
    String printedBy,
    OffsetDateTime printedAt,
    long historyNumber,
    String historyHead,
    int copy,
    PaperSize paper,
    Locale language) {}
