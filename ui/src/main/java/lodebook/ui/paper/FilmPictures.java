package lodebook.ui.paper;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.RingFlux;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.survey.Finding;
import lodebook.assembly.survey.PlacedMagnet;
import lodebook.reports.film.FilmMap;
import lodebook.reports.film.FilmPanel;
import lodebook.reports.film.FilmPicture;
import lodebook.reports.words.FacingWords;
import org.jspecify.annotations.Nullable;

/// What a viewing film shows on a ring, computed for the plan and for each suspected fault.
public final class FilmPictures {
  private static final double ABOVE_METRES = 1e-3;
  private static final double BESIDE_METRES = 3e-3;
  private static final double CELL_METRES = 0.25e-3;
  private static final int MOST_CELLS = 220;
  private static final int MOST_FAULTS = 3;

  private final RingDesign design;
  private final Map<Integer, PlacedMagnet> magnets;
  private final Locale language;

  /// @param design the ring
  /// @param magnets what stands in it
  /// @param language of the words
  public FilmPictures(RingDesign design, Map<Integer, PlacedMagnet> magnets, Locale language) {
    this.design = design;
    this.magnets = magnets;
    this.language = language;
  }

  /// The picture of the plan and of the first three findings.
  ///
  /// @param title the layout's or rotor's name
  /// @param planned title of the plan
  /// @param findings what is suspected, each with its title
  public FilmPicture of(String title, String planned, Map<Finding, String> findings) {
    List<FilmPanel> panels = new ArrayList<>();
    panels.add(panel(planned, null));
    findings.entrySet().stream()
        .limit(MOST_FAULTS)
        .forEach(each -> panels.add(panel(each.getValue(), each.getKey())));
    Layout layout = design.layout();
    return new FilmPicture(
        title,
        panels,
        ABOVE_METRES * 1e3,
        layout.workingRadiusMetres() * 1e3,
        design.slots(),
        risingRight(),
        language);
  }

  private boolean risingRight() {
    boolean clockwise = design.layout().numbering() == Numbering.CLOCKWISE;
    return (design.layout().focus() == Focus.IN) == clockwise;
  }

  /// What a finding is called beneath its film.
  public String title(Finding finding) {
    FacingWords facings = new FacingWords(language);
    Facing faces = finding.faces();
    String how = faces == null ? "" : ": " + facings.of(design.layout(), finding.slot(), faces);
    return finding.slot() + " " + finding.kind().word() + how;
  }

  private FilmPanel panel(String title, @Nullable Finding fault) {
    double[] remanence = new double[design.slots()];
    List<Facing> facings = new ArrayList<>(design.ruleFacings());
    magnets.forEach((slot, magnet) -> remanence[slot - 1] = magnet.strength().remanenceTesla());
    if (fault != null) {
      int at = fault.slot() - 1;
      Facing faces = fault.faces();
      Double share = fault.strengthShare();
      remanence[at] *= faces == null ? 0 : share == null ? 1 : share;
      facings.set(at, faces == null ? facings.get(at) : faces);
    }
    RingFlux flux = new RingFlux(design, remanence, facings);
    return new FilmPanel(title, flat(flux), wrapped(flux));
  }

  private FilmMap flat(RingFlux flux) {
    Layout layout = design.layout();
    double half = layout.slotRadiusMetres() + reach() + BESIDE_METRES;
    int cells = cells(2 * half);
    double sense = layout.numbering() == Numbering.CLOCKWISE ? 1 : -1;
    double first = Math.toRadians(layout.firstSlotClockDegrees());
    double height = axialMetres() / 2 + ABOVE_METRES;
    double[] through = new double[cells * cells];
    for (int row = 0; row < cells; row++) {
      double y = half - (row + 0.5) * 2 * half / cells;
      for (int column = 0; column < cells; column++) {
        double x = (column + 0.5) * 2 * half / cells - half;
        double angle = sense * (Math.atan2(x, y) - first);
        double radius = Math.hypot(x, y);
        Vector3 point = new Vector3(radius, 0, height).turnedAboutZ(angle);
        through[row * cells + column] = Math.abs(flux.at(point).z());
      }
    }
    return new FilmMap(2e3 * half, 2e3 * half, cells, through);
  }

  private FilmMap wrapped(RingFlux flux) {
    Layout layout = design.layout();
    double round = 2 * Math.PI * layout.workingRadiusMetres();
    double tall = axialMetres() + 2 * BESIDE_METRES;
    int perSlot =
        Math.max(
            4, (int) Math.round(Math.min(round / CELL_METRES, 4.0 * MOST_CELLS) / design.slots()));
    int columns = perSlot * design.slots();
    int rows = (int) Math.round(tall / CELL_METRES / 2);
    double[] through = new double[rows * columns];
    for (int column = 0; column < columns; column++) {
      double share = (column + 0.5) / columns;
      double onward = risingRight() ? share : 1 - share;
      double angle = 2 * Math.PI * (onward - 0.5 / design.slots());
      for (int row = 0; row < rows; row++) {
        double z = tall * (0.5 - (row + 0.5) / rows);
        Vector3 point = new Vector3(layout.workingRadiusMetres(), 0, z).turnedAboutZ(angle);
        through[row * columns + column] = Math.abs(flux.at(point).turnedAboutZ(-angle).x());
      }
    }
    return new FilmMap(1e3 * round, 1e3 * tall, columns, through);
  }

  private static int cells(double metres) {
    return (int) Math.round(Math.min(metres / CELL_METRES, MOST_CELLS));
  }

  private double axialMetres() {
    double most = 0;
    for (int slot = 1; slot <= design.slots(); slot++) {
      MagnetType type = design.typeAt(slot);
      most =
          Math.max(
              most,
              switch (type.shape()) {
                case DISC -> type.diameterMetres();
                case BLOCK, ROD, ARC -> type.lengthMetres();
              });
    }
    return most;
  }

  private double reach() {
    double most = 0;
    for (int slot = 1; slot <= design.slots(); slot++) {
      MagnetType type = design.typeAt(slot);
      most =
          Math.max(
              most,
              switch (type.shape()) {
                case BLOCK -> Math.hypot(type.thicknessMetres(), type.widthMetres()) / 2;
                case DISC -> Math.hypot(type.diameterMetres(), type.thicknessMetres()) / 2;
                case ROD -> type.diameterMetres() / 2;
                case ARC -> type.diameterMetres() / 2 - design.layout().slotRadiusMetres();
              });
    }
    return most;
  }
}
