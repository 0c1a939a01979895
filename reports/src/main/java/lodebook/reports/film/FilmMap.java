package lodebook.reports.film;

/// The flux that goes straight through a film, cell by cell.
///
/// @param widthMillimetres width of the film
/// @param heightMillimetres height of the film
/// @param columns cells in a row
/// @param throughTesla size of the flux density normal to the film at the middle of every cell, row
///   by row from the upper left corner, tesla; not to be changed
@SuppressWarnings("ArrayRecordComponent")
public record FilmMap(
    double widthMillimetres, double heightMillimetres, int columns, double[] throughTesla) {
  int rows() {
    return throughTesla.length / columns;
  }
}
