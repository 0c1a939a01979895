package lodebook.reports.film;

/// One state of a ring as a film shows it.
///
/// @param title what is shown: the plan, or a suspected fault
/// @param flat the film on the marked face, the axis in its middle
/// @param wrapped the film round the working circle, unrolled and seen from its side away from the
///   magnets, the marked face up; its edges are half a slot from the first and last slot
public record FilmPanel(String title, FilmMap flat, FilmMap wrapped) {}
