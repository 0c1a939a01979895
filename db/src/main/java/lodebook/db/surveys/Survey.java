package lodebook.db.surveys;

import java.time.Instant;
import lodebook.assembly.survey.Verdict;
import org.jspecify.annotations.Nullable;

/// A survey in the book.
///
/// @param code its number, such as `S-12`
/// @param rotor the rotor it is of
/// @param readings how many readings it holds
/// @param voided whether it was declared void
/// @param by who began it
/// @param at when, as stated
/// @param verdict what the latest check said, or null where none was made since the readings or the
///   ring changed
public record Survey(
    String code,
    String rotor,
    int readings,
    boolean voided,
    String by,
    Instant at,
    @Nullable Verdict verdict) {}
