package lodebook.ui.desk.ring;

import java.util.function.IntConsumer;
import java.util.function.IntFunction;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleIntegerProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Region;
import javafx.scene.transform.Scale;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.magnet.MagnetType;
import lodebook.reports.canvas.Typeface;
import lodebook.reports.ring.Face;
import lodebook.reports.ring.RingDrawing;
import lodebook.reports.ring.RingPicture;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// The ring as one control for all rooms: the drawing of the paper, with any slot on top, seen from
/// either face; a slot is chosen by touch or by the arrow keys and told to screen readers.
///
/// Keys: left and right choose the next slot in the picture, Home chooses slot 1, Space turns the
/// chosen slot to the top, F shows the other face.
public final class RingControl extends Region {
  /// Drawn at twice the size and shown at half, so that it stays sharp on fine screens.
  private static final double FINE = 2;

  private static final double PIXELS_PER_MILLIMETRE = 96 / 25.4;
  private static final double LEAST_MILLIMETRES = 30;
  private static final double BENEATH_RING = 7;

  /// Room above the ring for the frame of a slot that is pointed at, millimetres.
  private static final double ABOVE_RING = 2.5;

  private final DeskWords words;
  private final Typeface typeface = new Typeface();
  private final Canvas canvas = new Canvas();
  private final ObjectProperty<@Nullable RingPicture> picture = new SimpleObjectProperty<>();
  private final ObjectProperty<@Nullable Facing> large = new SimpleObjectProperty<>();
  private final ObjectProperty<Look> look;
  private final IntegerProperty top = new SimpleIntegerProperty(0);
  private final IntegerProperty chosen = new SimpleIntegerProperty(0);
  private final BooleanProperty otherFace = new SimpleBooleanProperty(false);
  private final BooleanProperty explained = new SimpleBooleanProperty(false);
  private IntFunction<String> story = _ -> "";
  private IntConsumer touched = _ -> {};
  private @Nullable RingPicture shown;

  /// @param words the desktop's language
  /// @param look the theme in force; it may change
  public RingControl(DeskWords words, ObjectProperty<Look> look) {
    this.words = words;
    this.look = look;
    getStyleClass().add("ring-control");
    canvas.getTransforms().add(new Scale(1 / FINE, 1 / FINE));
    canvas.setManaged(false);
    getChildren().add(canvas);
    setFocusTraversable(true);
    setAccessibleRole(AccessibleRole.IMAGE_VIEW);
    setMinSize(120, 120);
    for (var each : java.util.List.of(picture, large, look, top, chosen, otherFace, explained)) {
      each.addListener((_, _, _) -> requestLayout());
    }
    addEventHandler(MouseEvent.MOUSE_CLICKED, this::touch);
    addEventHandler(KeyEvent.KEY_PRESSED, this::key);
  }

  /// What is shown; null for nothing.
  public ObjectProperty<@Nullable RingPicture> picture() {
    return picture;
  }

  /// The facing of a magnet drawn large in the middle, for the slot on top; null for none.
  public ObjectProperty<@Nullable Facing> large() {
    return large;
  }

  /// The slot that stands on top; 0 where the layout decides.
  public IntegerProperty top() {
    return top;
  }

  /// The slot that is pointed at; 0 for none.
  public IntegerProperty chosen() {
    return chosen;
  }

  /// Whether the other face is looked at, mirrored.
  public BooleanProperty otherFace() {
    return otherFace;
  }

  /// Whether the signs of the picture are explained beneath it.
  public BooleanProperty explained() {
    return explained;
  }

  /// What a slot's story is, for screen readers.
  public void tellsOf(IntFunction<String> slotStory) {
    this.story = slotStory;
    requestLayout();
  }

  /// Who is told that a slot was touched.
  public void whenTouched(IntConsumer listener) {
    this.touched = listener;
  }

  @Override
  protected double computePrefWidth(double height) {
    return 420;
  }

  @Override
  protected double computePrefHeight(double width) {
    return 420;
  }

  @Override
  protected void layoutChildren() {
    double width = getWidth() - 6;
    double height = getHeight() - 6;
    canvas.relocate(3, 3);
    canvas.setWidth(Math.max(1, width * FINE));
    canvas.setHeight(Math.max(1, height * FINE));
    canvas.getGraphicsContext2D().clearRect(0, 0, width * FINE, height * FINE);
    shown = view();
    if (shown != null) {
      draw(shown, width / PIXELS_PER_MILLIMETRE, height / PIXELS_PER_MILLIMETRE);
    }
    setAccessibleText(description());
  }

  private @Nullable RingPicture view() {
    RingPicture given = picture.get();
    if (given == null) {
      return null;
    }
    RingPicture seen = given.seenOn(otherFace.get() ? Face.OTHER : Face.MARKED);
    RingPicture turned = top.get() > 0 ? RingTurn.withOnTop(seen, top.get()) : seen;
    return chosen.get() > 0 ? turned.pointingAt(chosen.get()) : turned;
  }

  private void draw(RingPicture view, double width, double height) {
    if (width < LEAST_MILLIMETRES || height < LEAST_MILLIMETRES) {
      return;
    }
    RingDrawing drawing = fitted(view, width, height - ABOVE_RING);
    lodebook.reports.canvas.Canvas screen =
        new ScreenCanvas(
                canvas.getGraphicsContext2D(),
                typeface,
                new RingColours(look.get()),
                FINE * PIXELS_PER_MILLIMETRE)
            .moved(0, ABOVE_RING);
    if (explained.get()) {
      drawing.draw(screen);
    } else {
      drawing.drawBare(screen);
    }
    Facing middle = large.get();
    if (middle != null) {
      double free = freeRadius(view, drawing.scale());
      BigMagnet.draw(
          screen.moved(width / 2, ringRadius(drawing)), free, middle, view.view().sense());
    }
  }

  /// The drawing for this room; without the legend the ring takes its place, and the bar of
  /// millimetres falls below the edge.
  private RingDrawing fitted(RingPicture view, double width, double height) {
    RingDrawing first = RingDrawing.fitting(view, typeface, width, height);
    if (explained.get()) {
      return first;
    }
    double legend = first.height() - first.bareHeight();
    return RingDrawing.fitting(view, typeface, width, height + legend + BENEATH_RING);
  }

  private static double ringRadius(RingDrawing drawing) {
    return (drawing.bareHeight() - BENEATH_RING) / 2;
  }

  private static double freeRadius(RingPicture view, double scale) {
    MagnetType type = view.type();
    double reach =
        switch (type.shape()) {
          case BLOCK -> Math.max(type.thicknessMetres(), type.widthMetres()) / 2;
          case DISC, ROD -> type.diameterMetres() / 2;
          case ARC -> (type.diameterMetres() - type.innerDiameterMetres()) / 4;
        };
    return Math.max(4, 1e3 * (view.layout().slotRadiusMetres() - reach) * scale - 9);
  }

  private void touch(MouseEvent event) {
    requestFocus();
    RingPicture view = shown;
    if (view == null) {
      return;
    }
    double x = event.getX() - getWidth() / 2;
    double y = event.getY() - ringMiddle(view);
    choose(RingTurn.slotAt(view, x, y));
    event.consume();
  }

  private double ringMiddle(RingPicture view) {
    double width = (getWidth() - 6) / PIXELS_PER_MILLIMETRE;
    double height = (getHeight() - 6) / PIXELS_PER_MILLIMETRE;
    if (width < LEAST_MILLIMETRES || height < LEAST_MILLIMETRES) {
      return getHeight() / 2;
    }
    return 3
        + (ABOVE_RING + ringRadius(fitted(view, width, height - ABOVE_RING)))
            * PIXELS_PER_MILLIMETRE;
  }

  private void choose(int slot) {
    chosen.set(slot);
    touched.accept(slot);
    setAccessibleText(description());
  }

  private void key(KeyEvent event) {
    RingPicture view = shown;
    if (view == null) {
      return;
    }
    int slots = view.layout().slots();
    int now = chosen.get() > 0 ? chosen.get() : Math.max(1, top.get());
    int right = view.view().sense();
    switch (event.getCode()) {
      case RIGHT -> choose(Math.floorMod(now - 1 + right, slots) + 1);
      case LEFT -> choose(Math.floorMod(now - 1 - right, slots) + 1);
      case HOME -> choose(1);
      case SPACE -> top.set(now);
      case F -> otherFace.set(!otherFace.get());
      default -> {
        return;
      }
    }
    event.consume();
  }

  /// What a screen reader reads.
  String description() {
    RingPicture view = view();
    if (view == null) {
      return words.say("ring.none");
    }
    String face = words.say(view.face() == Face.MARKED ? "ring.face.marked" : "ring.face.other");
    String way = words.say(view.view().sense() > 0 ? "ring.way.clockwise" : "ring.way.counter");
    String whole =
        words.say("ring.description", view.title(), words.number(view.layout().slots()), face, way);
    Integer slot = view.highlighted();
    return slot == null ? whole : whole + " " + slotWords(slot);
  }

  private String slotWords(int slot) {
    String told = story.apply(slot);
    return told.isEmpty() ? words.say("ring.slot", words.number(slot)) : told;
  }
}
