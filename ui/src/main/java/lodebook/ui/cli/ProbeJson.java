package lodebook.ui.cli;

import java.util.List;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.survey.NamedFault;
import lodebook.assembly.survey.ProbeReport;
import lodebook.assembly.survey.ToldApart;
import lodebook.db.layouts.LayoutWords;

/// What readings tell apart, as JSON.
final class ProbeJson {
  private ProbeJson() {}

  static Json of(Layout layout, ProbeReport own, ProbeReport fewest) {
    Json document = Json.object().put("layout", layout.code()).put("revision", layout.revision());
    add(document, own);
    Json proposed = Json.object();
    add(proposed, fewest);
    proposed.put(
        "points",
        fewest.points().stream()
            .map(
                p ->
                    Json.object()
                        .put("slot", p.slot())
                        .put("spot", LayoutWords.word(p.spot()))
                        .put("component", LayoutWords.word(p.component())))
            .toList());
    return document.put("proposed", proposed);
  }

  private static void add(Json document, ProbeReport report) {
    document
        .put("readings", report.points().size())
        .put("tellsAll", report.tellsAll())
        .put("worstSingle", told(report.worstSingle()))
        .put("worstPair", told(report.worstPair()))
        .put("singlesAlike", report.singlesAlike().stream().map(ProbeJson::told).toList())
        .put("pairsAlike", report.pairsAlike().stream().map(ProbeJson::told).toList());
  }

  /// The short form that a released layout shows.
  static Json brief(ProbeReport report) {
    return Json.object()
        .put("tellsAll", report.tellsAll())
        .put("worstSingle", told(report.worstSingle()))
        .put("worstPair", told(report.worstPair()));
  }

  private static Json told(ToldApart two) {
    return Json.object()
        .put("one", faults(two.one()))
        .put("other", faults(two.other()))
        .put("errorRate", two.errorRate());
  }

  private static List<Json> faults(List<NamedFault> faults) {
    return faults.stream()
        .map(f -> Json.object().put("slot", f.slot()).put("kind", f.kind().word()))
        .toList();
  }
}
