package lodebook.ui.desk.stock;

import java.util.ArrayList;
import java.util.List;
import javafx.beans.property.ObjectProperty;
import javafx.geometry.VPos;
import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.layout.Region;
import javafx.scene.paint.Color;
import javafx.scene.text.Font;
import javafx.scene.text.TextAlignment;
import javafx.scene.transform.Scale;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.Strength;
import lodebook.db.stock.Piece;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// How the remanences of a lot are spread, beside the certificate and the grade's range.
final class HistogramView extends Region {
  private static final double FINE = 2;
  private static final double FOOT = 40;
  private static final double HEAD = 22;
  private static final double SIDE = 34;
  private static final String FAMILY = "DejaVu Sans Condensed";

  private final DeskWords words;
  private final ObjectProperty<Look> look;
  private final Canvas canvas = new Canvas();
  private StockPage.@Nullable OneLot lot;

  HistogramView(DeskWords words, ObjectProperty<Look> look) {
    this.words = words;
    this.look = look;
    canvas.getTransforms().add(new Scale(1 / FINE, 1 / FINE));
    canvas.setManaged(false);
    getChildren().add(canvas);
    setMinHeight(150);
    setPrefHeight(190);
    setAccessibleRole(AccessibleRole.IMAGE_VIEW);
    look.addListener((_, _, _) -> requestLayout());
  }

  void show(StockPage.OneLot shown) {
    lot = shown;
    requestLayout();
  }

  private List<Double> values() {
    List<Double> values = new ArrayList<>();
    StockPage.OneLot shown = lot;
    if (shown != null) {
      for (Piece piece : shown.pieces()) {
        Strength strength = piece.strength();
        if (strength != null) {
          values.add(strength.remanenceTesla());
        }
      }
    }
    return values;
  }

  @Override
  protected void layoutChildren() {
    canvas.setWidth(Math.max(1, getWidth() * FINE));
    canvas.setHeight(Math.max(1, getHeight() * FINE));
    GraphicsContext g = canvas.getGraphicsContext2D();
    g.setTransform(FINE, 0, 0, FINE, 0, 0);
    g.clearRect(0, 0, getWidth(), getHeight());
    StockPage.OneLot shown = lot;
    List<Double> values = values();
    if (shown == null || values.isEmpty()) {
      return;
    }
    Grade grade = shown.grade();
    Double certificate = shown.lot().received().certificateRemanenceTesla();
    List<Double> marks = new ArrayList<>();
    if (grade != null) {
      marks.add(grade.remanenceLowTesla());
      marks.add(grade.remanenceHighTesla());
    }
    if (certificate != null) {
      marks.add(certificate);
    }
    Histogram histogram = Histogram.of(values, marks);
    new Drawing(g, histogram).all(grade, certificate);
    setAccessibleText(
        words.say(
            "stock.histogram",
            words.number(values.size()),
            words.milliTesla(values.stream().mapToDouble(v -> v).min().orElse(0)),
            words.milliTesla(values.stream().mapToDouble(v -> v).max().orElse(0))));
  }

  /// One drawing of a histogram on a place.
  private final class Drawing {
    private final GraphicsContext g;
    private final Histogram histogram;
    private final double bottom = getHeight() - FOOT;

    Drawing(GraphicsContext g, Histogram histogram) {
      this.g = g;
      this.histogram = histogram;
    }

    private Color color(String role) {
      return look.get().color(role);
    }

    private double x(double tesla) {
      double share =
          (tesla - histogram.lowTesla()) / (histogram.highTesla() - histogram.lowTesla());
      return SIDE + share * (getWidth() - 2 * SIDE);
    }

    void all(@Nullable Grade grade, @Nullable Double certificate) {
      g.setFont(Font.font(FAMILY, 13));
      g.setTextBaseline(VPos.TOP);
      if (grade != null) {
        range(grade);
      }
      bars();
      if (certificate != null) {
        line(certificate);
      }
      foot();
    }

    private void range(Grade grade) {
      double left = x(grade.remanenceLowTesla());
      double right = x(grade.remanenceHighTesla());
      g.setFill(color("-shade"));
      g.fillRect(left, HEAD, right - left, bottom - HEAD);
      text(
          words.say("stock.grade-range", grade.name()),
          (left + right) / 2,
          bottom + 20,
          TextAlignment.CENTER,
          "-pencil");
    }

    private void bars() {
      double high = (bottom - HEAD - 14) / Math.max(1, histogram.most());
      for (int i = 0; i < histogram.counts().size(); i++) {
        int count = histogram.counts().get(i);
        double left = x(histogram.lowTesla() + i * histogram.stepTesla());
        double right = x(histogram.lowTesla() + (i + 1) * histogram.stepTesla());
        if (count > 0) {
          g.setFill(color("-south"));
          g.setStroke(color("-graphite"));
          g.setLineWidth(1.2);
          g.fillRect(left + 1, bottom - count * high, right - left - 2, count * high);
          g.strokeRect(left + 1, bottom - count * high, right - left - 2, count * high);
          text(
              words.number(count),
              (left + right) / 2,
              bottom - count * high - 16,
              TextAlignment.CENTER,
              "-graphite");
        }
      }
      g.setStroke(color("-graphite"));
      g.setLineWidth(1.5);
      g.strokeLine(SIDE, bottom, getWidth() - SIDE, bottom);
    }

    private void line(double certificate) {
      double at = x(certificate);
      g.setStroke(color("-graphite"));
      g.setLineWidth(2);
      g.setLineDashes(6, 4);
      g.strokeLine(at, 16, at, bottom);
      g.setLineDashes();
      text(
          words.say("stock.certificate-line", words.milliTesla(certificate)),
          at,
          0,
          TextAlignment.CENTER,
          "-graphite");
    }

    private void foot() {
      text(
          words.say("stock.millitesla", words.number(histogram.lowTesla() * 1e3, 0)),
          SIDE,
          bottom + 4,
          TextAlignment.LEFT,
          "-pencil");
      text(
          words.say("stock.millitesla", words.number(histogram.highTesla() * 1e3, 0)),
          getWidth() - SIDE,
          bottom + 4,
          TextAlignment.RIGHT,
          "-pencil");
    }

    private void text(String said, double x, double y, TextAlignment where, String role) {
      g.setFill(color(role));
      g.setTextAlign(where);
      g.fillText(said, x, y);
    }
  }
}
