package lodebook.db.builds;

import java.time.Instant;
import org.jspecify.annotations.Nullable;

/// A ring on the bench, or one that was there.
///
/// @param code its serial number
/// @param layout the layout revision it is built to, `CODE@REVISION`
/// @param batch its batch, or null for a rotor alone
/// @param gearNumber for which gear of its batch it is, from 1; null for a rotor alone or a spare
/// @param ring `inner` or `outer` in a batch, else null
/// @param state `open`, `held` or `scrapped`
/// @param slots how many slots it has
/// @param filled how many of them hold a magnet
/// @param planned whether a plan counts for it
/// @param latestSurvey its latest survey, such as `S-12`, or null
/// @param unit the unit it is in, or null
/// @param openedAt when it was opened
public record Rotor(
    String code,
    String layout,
    @Nullable String batch,
    @Nullable Integer gearNumber,
    @Nullable String ring,
    String state,
    int slots,
    int filled,
    boolean planned,
    @Nullable String latestSurvey,
    @Nullable String unit,
    Instant openedAt) {}
