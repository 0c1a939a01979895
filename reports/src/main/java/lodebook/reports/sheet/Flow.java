package lodebook.reports.sheet;

import java.util.List;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Typeface;
import lodebook.reports.canvas.Wrap;

/// Puts content on the pages of a sheet from the top down and begins pages as they are needed.
public final class Flow {
  private final Sheet sheet;
  private Canvas page;
  private double y;

  /// Begins the sheet's first page.
  public Flow(Sheet sheet) {
    this.sheet = sheet;
    this.page = sheet.newPage();
    this.y = sheet.contentTop();
  }

  /// The typeface of the sheet.
  public Typeface typeface() {
    return sheet.typeface();
  }

  /// Width of the content, millimetres.
  public double width() {
    return sheet.contentWidth();
  }

  /// Height that is left on this page, millimetres.
  public double room() {
    return sheet.contentBottom() - y;
  }

  /// Height of a whole page's content with its head, millimetres.
  public double pageRoom() {
    return sheet.contentBottom() - Sheet.TOP - 12;
  }

  /// Begins a page.
  public void newPage() {
    page = sheet.newPage();
    y = sheet.contentTop();
  }

  /// Begins a page unless this one has the height left.
  public void need(double height) {
    if (room() < height) {
      newPage();
    }
  }

  /// Leaves a gap, except at the top of a page.
  public void gap(double height) {
    if (y > sheet.contentTop()) {
      y += height;
    }
  }

  /// Takes a strip of a height across the page.
  ///
  /// @return a canvas whose origin is the strip's upper left corner
  public Canvas take(double height) {
    need(height);
    Canvas strip = page.moved(Sheet.MARGIN, y);
    y += height;
    return strip;
  }

  /// Sets a heading and keeps it with a height that follows.
  public void heading(String text, double keepWith) {
    gap(4);
    Lettering lettering = Lettering.bold(13);
    List<String> lines = Wrap.lines(text, typeface(), lettering, width());
    need(6.2 * lines.size() + 1 + keepWith);
    for (String line : lines) {
      take(6.2).text(line, 0, 4.6, lettering, Anchor.START);
    }
    y += 1;
  }

  /// Sets a paragraph, line by line.
  public void paragraph(String text, Lettering lettering) {
    double pitch = 1.3 * lettering.sizeMillimetres();
    for (String line : Wrap.lines(text, typeface(), lettering, width())) {
      take(pitch).text(line, 0, 0.78 * pitch, lettering, Anchor.START);
    }
  }
}
