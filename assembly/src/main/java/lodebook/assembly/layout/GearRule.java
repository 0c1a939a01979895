package lodebook.assembly.layout;

import java.util.ArrayList;
import java.util.List;

/// What a gear model must keep to, and what is worth a warning.
public final class GearRule {
  private GearRule() {}

  /// Everything that is wrong with a model, each a sentence with the remedy; empty where nothing
  /// is.
  public static List<String> faults(GearModel gear) {
    List<String> faults = new ArrayList<>();
    String name = "gear model " + gear.spoken() + ": ";
    Layout inner = gear.inner().layout();
    Layout outer = gear.outer().layout();
    int sum = inner.polePairs() + outer.polePairs();
    if (gear.modulatorPieces() != sum) {
      faults.add(
          name
              + gear.modulatorPieces()
              + " modulator pieces, but "
              + inner.polePairs()
              + " and "
              + outer.polePairs()
              + " pole pairs need "
              + sum
              + "; set modulatorPieces to "
              + sum);
    }
    if (inner.focus() != Focus.OUT) {
      faults.add(
          name
              + "the inner layout "
              + spoken(inner)
              + " focuses in; choose one with \"focus\": \"out\"");
    }
    if (outer.focus() != Focus.IN) {
      faults.add(
          name
              + "the outer layout "
              + spoken(outer)
              + " focuses out; choose one with \"focus\": \"in\"");
    }
    if (!(gear.stackMetres() > 0)) {
      faults.add(
          name
              + "stackMillimetres is "
              + Rounded.millimetres(gear.stackMetres())
              + "; it must be above 0");
    }
    nesting(gear, name, faults);
    return faults;
  }

  /// What a model may do but shouldn't, each a sentence with a proposal.
  public static List<String> warnings(GearModel gear) {
    int innerFactor = gear.innerCoggingFactor();
    int outerFactor = gear.outerCoggingFactor();
    if (innerFactor <= 1 && outerFactor <= 1) {
      return List.of();
    }
    PolePairChoice choice =
        new PolePairChoice(gear.inner().layout().polePairs(), gear.outer().layout().polePairs());
    String proposal =
        choice
            .smootherNeighbour()
            .map(
                better ->
                    "; "
                        + better.inner()
                        + " and "
                        + better.outer()
                        + " pole pairs with "
                        + better.pieces()
                        + " pieces would run smoother ("
                        + GearModel.coggingFactor(better.inner(), better.pieces())
                        + " and "
                        + GearModel.coggingFactor(better.outer(), better.pieces())
                        + ")")
            .orElse("");
    return List.of(
        "gear model "
            + gear.spoken()
            + ": runs roughly, cogging factors "
            + innerFactor
            + " (inner) and "
            + outerFactor
            + " (outer), 1 is smoothest"
            + proposal);
  }

  private static void nesting(GearModel gear, String name, List<String> faults) {
    double within = RingReach.outermost(gear.inner());
    double around = RingReach.innermost(gear.outer());
    Double modulatorInner = gear.modulatorInnerRadiusMetres();
    Double modulatorOuter = gear.modulatorOuterRadiusMetres();
    if (modulatorInner != null && modulatorOuter != null && modulatorOuter <= modulatorInner) {
      faults.add(
          name
              + "modulatorOuterRadiusMillimetres "
              + Rounded.millimetres(modulatorOuter)
              + " is not above modulatorInnerRadiusMillimetres "
              + Rounded.millimetres(modulatorInner));
      return;
    }
    double innerLimit = modulatorInner != null ? modulatorInner : around;
    if (within >= innerLimit) {
      faults.add(
          name
              + "the inner layout's magnets reach out to "
              + Rounded.millimetres(within)
              + " mm, "
              + (modulatorInner != null ? "the iron pieces" : "the outer layout's magnets")
              + " begin at "
              + Rounded.millimetres(innerLimit)
              + " mm; choose a smaller inner layout"
              + (modulatorInner != null
                  ? " or raise modulatorInnerRadiusMillimetres above " + Rounded.up(within)
                  : ""));
    }
    if (modulatorOuter != null && modulatorOuter >= around) {
      faults.add(
          name
              + "the iron pieces reach out to "
              + Rounded.millimetres(modulatorOuter)
              + " mm, the outer layout's magnets begin at "
              + Rounded.millimetres(around)
              + " mm; lower modulatorOuterRadiusMillimetres below "
              + Rounded.down(around));
    }
  }

  private static String spoken(Layout layout) {
    return layout.code() + " rev " + layout.revision();
  }
}
