package lodebook.reports.film;

import java.util.List;
import java.util.Locale;

/// What a viewing film shows on a ring, for the plan and each suspected fault.
///
/// @param title the layout's or rotor's name
/// @param panels the states, the plan first
/// @param heightMillimetres height of the flat film above the face
/// @param radiusMillimetres radius of the wrapped film
/// @param slots number of slots, for the marks beside the wrapped film
/// @param risingRight whether slot numbers rise to the right on the wrapped film, seen from its
///   side away from the magnets
/// @param language the language of the words
public record FilmPicture(
    String title,
    List<FilmPanel> panels,
    double heightMillimetres,
    double radiusMillimetres,
    int slots,
    boolean risingRight,
    Locale language) {
  public FilmPicture {
    panels = List.copyOf(panels);
  }
}
