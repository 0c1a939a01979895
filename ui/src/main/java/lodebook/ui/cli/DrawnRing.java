package lodebook.ui.cli;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.survey.FaultKind;
import lodebook.assembly.survey.Finding;
import lodebook.assembly.survey.PlacedMagnet;
import lodebook.assembly.survey.Reading;
import lodebook.db.book.Book;
import lodebook.db.builds.RotorShown;
import lodebook.db.layouts.Layouts;
import lodebook.db.stock.Grades;
import lodebook.db.surveys.RecordedReading;
import lodebook.db.surveys.SurveyChecks;
import lodebook.db.surveys.Surveys;
import lodebook.reports.film.FieldDrawing;
import lodebook.reports.film.FieldPicture;
import lodebook.reports.film.FilmDrawing;
import lodebook.reports.film.FilmPicture;
import lodebook.reports.film.PictureFiles;
import lodebook.ui.craft.ProbedLayout;
import lodebook.ui.paper.FieldPictures;
import lodebook.ui.paper.FilmPictures;
import org.jspecify.annotations.Nullable;

/// What pictures of a layout or a rotor are computed from: its magnets, and of a rotor its latest
/// survey.
///
/// @param title the layout's or rotor's name
/// @param design the ring
/// @param magnets what stands in it; of a layout, magnets as they usually come
/// @param survey the rotor's latest survey explained, or null where there is none
record DrawnRing(
    String title,
    RingDesign design,
    Map<Integer, PlacedMagnet> magnets,
    SurveyChecks.@Nullable Checked survey) {
  static DrawnRing ofLayout(Book book, String code) {
    RingDesign design = new Layouts(book).design(code);
    return new DrawnRing(
        LayoutShow.shown(design.layout()),
        design,
        ProbedLayout.magnets(design, new Grades(book).list()),
        null);
  }

  static DrawnRing ofRotor(Book book, RotorShown rotor) {
    String code = rotor.rotor().code();
    if (!new Surveys(book).list(code).stream().allMatch(survey -> survey.voided())) {
      SurveyChecks.Checked checked = SurveyChecks.check(book, List.of(code));
      return new DrawnRing(
          code, rotor.design(), checked.survey().stages().getLast().ring().magnets(), checked);
    }
    Map<Integer, PlacedMagnet> usual =
        ProbedLayout.magnets(rotor.design(), new Grades(book).list());
    usual.keySet().retainAll(rotor.standing().stream().map(p -> p.slot()).toList());
    return new DrawnRing(code, rotor.design(), usual, null);
  }

  PictureFiles film(String kind, String planned, Locale language) {
    FilmPictures pictures = new FilmPictures(design, magnets, language);
    Map<Finding, String> suspected = new LinkedHashMap<>();
    if (survey != null) {
      survey.diagnosis().findings().stream()
          .filter(finding -> finding.kind() != FaultKind.SUSPECT_READING)
          .forEach(finding -> suspected.put(finding, pictures.title(finding)));
    }
    FilmPicture picture = pictures.of(title, planned, suspected);
    return new PictureFiles(kind, (typeface, width) -> new FilmDrawing(picture, typeface, width));
  }

  PictureFiles field(String kind, Locale language) {
    List<Reading> readings =
        survey == null
            ? List.of()
            : survey.survey().readings().stream().map(RecordedReading::reading).toList();
    FieldPicture picture = FieldPictures.of(title, design, magnets, readings, language);
    return new PictureFiles(kind, (typeface, width) -> new FieldDrawing(picture, typeface, width));
  }
}
