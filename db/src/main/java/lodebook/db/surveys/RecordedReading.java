package lodebook.db.surveys;

import java.time.Instant;
import lodebook.assembly.survey.Reading;

/// A reading in the book.
///
/// @param survey the survey's number
/// @param number its place in the survey, from 1
/// @param reading what was read, with its meter
/// @param unit the unit in which it was stated
/// @param by who read it
/// @param at when, as stated
/// @param sequence line of history that recorded it
public record RecordedReading(
    String survey,
    int number,
    Reading reading,
    FluxUnit unit,
    String by,
    Instant at,
    long sequence) {}
