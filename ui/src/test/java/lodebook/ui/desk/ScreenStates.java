package lodebook.ui.desk;

import java.util.Locale;
import javafx.scene.control.Button;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import lodebook.ui.desk.Screens.Open;
import lodebook.ui.desk.Screens.View;
import lodebook.ui.desk.bench.BenchGauge;
import lodebook.ui.desk.room.FileDrop;

/// The states of which pictures are taken.
final class ScreenStates {
  private ScreenStates() {}

  /// Takes all pictures whose name begins so.
  static void all(Screens screens, String start) {
    bench(screens, start);
    waiting(screens, start);
    trace(screens, start);
    history(screens, start);
    survey(screens, start);
    stock(screens, start);
    shop(screens, start);
  }

  private static void shop(Screens screens, String start) {
    if (!"shop".startsWith(start)) {
      return;
    }
    screens.take("shop", Locale.ENGLISH, View.FEW, open -> open.window().open("shop", null));
    screens.take("shop-de", Locale.GERMAN, View.FEW, open -> open.window().open("shop", null));
    screens.takeEmpty("first-start", Locale.ENGLISH, View.FEW, open -> open.window().begin());
    screens.take(
        "contrast-bench",
        Locale.ENGLISH,
        java.util.List.of(View.CONTRAST),
        open -> {
          open.window().open("bench", "R-9");
          steps(open, 3);
        });
  }

  private static void stock(Screens screens, String start) {
    if (!"stock".startsWith(start)) {
      return;
    }
    screens.take("stock-lots", Locale.ENGLISH, View.FEW, open -> open.window().open("stock", null));
    screens.take(
        "stock-lot", Locale.ENGLISH, View.MOST, open -> open.window().open("stock", "L-2501"));
    screens.take(
        "stock-tray", Locale.ENGLISH, View.FEW, open -> open.window().open("stock", "TR-C"));
    screens.take(
        "stock-piece", Locale.GERMAN, View.FEW, open -> open.window().open("stock", "L-2501/0007"));
    screens.take(
        "stock-bad-file",
        Locale.ENGLISH,
        View.FEW,
        open -> {
          open.window().open("stock", "L-2502");
          open.settle();
          FileDrop.drop(open.find("#stock"), open.shop().file("readings.csv", BAD_READINGS));
        });
  }

  private static final String BAD_READINGS =
      """
      piece,tray,cell,value,unit,standoff_mm,temperature_C
      1,TR-E,A1,171.2,mT,1.5,20
      2,TR-E,A2,-170.0,mT,1.5,20
      3,TR-E,A1,169.4,mT,1.5,20
      4,TR-E,A4,169.9,mTesla,1.5,20
      """;

  private static void waiting(Screens screens, String start) {
    if (!"waiting".startsWith(start)) {
      return;
    }
    screens.take("waiting", Locale.ENGLISH, View.MOST, open -> open.window().open("waiting", null));
    screens.take(
        "waiting-de", Locale.GERMAN, View.FEW, open -> open.window().open("waiting", null));
  }

  private static void trace(Screens screens, String start) {
    if (!"trace".startsWith(start)) {
      return;
    }
    screens.take(
        "trace-unit", Locale.ENGLISH, View.MOST, open -> open.window().open("trace", "U-101"));
    screens.take(
        "trace-rotor", Locale.ENGLISH, View.FEW, open -> open.window().open("trace", "B-31-0001"));
    screens.take(
        "trace-unknown", Locale.GERMAN, View.FEW, open -> open.window().open("trace", "X-99"));
  }

  private static void history(Screens screens, String start) {
    if (!"history".startsWith(start)) {
      return;
    }
    screens.take("history", Locale.ENGLISH, View.MOST, open -> open.window().open("history", null));
    screens.take(
        "history-checked",
        Locale.GERMAN,
        View.FEW,
        open -> {
          open.window().open("history", "L-2501");
          open.settle();
          press(open, "#verify");
        });
  }

  private static void survey(Screens screens, String start) {
    if (!"survey".startsWith(start)) {
      return;
    }
    screens.take(
        "survey-fault",
        Locale.ENGLISH,
        View.MOST,
        open -> {
          open.shop().built("R-9", 4);
          open.window().open("survey", "R-9");
        });
    screens.take(
        "survey-round",
        Locale.ENGLISH,
        View.FEW,
        open -> {
          open.shop().built("R-9", 0);
          open.window().open("survey", "R-9");
          open.settle();
          press(open, "#fresh");
          for (String reading : new String[] {"433.1", "0.4", "2,1", "-262"}) {
            type(open, "#survey-reading", reading);
          }
        });
    screens.take(
        "survey-pass",
        Locale.GERMAN,
        View.FEW,
        open -> {
          open.shop().built("R-9", 0);
          open.window().open("survey", "R-9");
        });
    screens.take(
        "survey-which", Locale.ENGLISH, View.FEW, open -> open.window().open("survey", null));
  }

  private static void press(Open open, String selector) {
    ((Button) open.find(selector)).fire();
    open.settle();
  }

  private static void bench(Screens screens, String start) {
    if (!"bench".startsWith(start)) {
      return;
    }
    screens.take(
        "bench-which", Locale.ENGLISH, View.FEW, open -> open.window().open("bench", null));
    screens.take(
        "bench-step",
        Locale.ENGLISH,
        View.MOST,
        open -> {
          open.window().open("bench", "R-9");
          steps(open, 3);
        });
    screens.take(
        "bench-wrong",
        Locale.ENGLISH,
        View.MOST,
        open -> {
          open.window().open("bench", "R-9");
          steps(open, 3);
          wrong(open);
        });
    screens.take(
        "bench-step-de",
        Locale.GERMAN,
        View.FEW,
        open -> {
          open.window().open("bench", "R-9");
          steps(open, 2);
        });
  }

  /// Types a reading and presses Enter.
  static void type(Open open, String text) {
    type(open, "#reading", text);
  }

  private static void type(Open open, String selector, String text) {
    open.settle();
    TextField field = (TextField) open.find(selector);
    field.setText(text);
    field.fireEvent(
        new KeyEvent(KeyEvent.KEY_PRESSED, "", "", KeyCode.ENTER, false, false, false, false));
    open.settle();
  }

  /// Takes as many steps with readings as a gauge would show them.
  static void steps(Open open, int count) {
    for (int i = 0; i < 2 * count; i++) {
      type(open, gauge(open).reads("R-9"));
    }
  }

  /// Takes the next step with its magnet the wrong way round.
  static void wrong(Open open) {
    int slot = gauge(open).slot("R-9");
    while (open.root().lookup("#reading") != null) {
      type(open, gauge(open).reads("R-9", slot));
    }
  }

  private static BenchGauge gauge(Open open) {
    return new BenchGauge(open.shop().station(Locale.ENGLISH, "TB"));
  }
}
