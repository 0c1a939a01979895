package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import java.util.stream.Collectors;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.survey.ProbeDesign;
import lodebook.assembly.survey.ProbeReport;
import lodebook.assembly.survey.ToldApart;
import lodebook.db.layouts.LayoutWords;
import lodebook.db.layouts.Layouts;
import lodebook.db.stock.Grades;
import lodebook.ui.craft.ProbedLayout;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Says what a layout's probe points tell apart, and which fewer or other readings would tell
/// enough.
@Command(
    name = "probe",
    description = {
      "Say which faults the layout's readings tell apart and how often they mistake one for another,",
      "and propose the fewest readings that tell enough: every single reversal, quarter turn and",
      "absence at 1 in 1000, every pair of reversals at 1 in 100."
    },
    footer = {"", "Example:", "  lodebook layout probe STIR-IN"})
final class LayoutProbe extends Verb {
  private static final int MOST_ROWS = 20;
  private static final int WIDTH = 80;

  @Parameters(paramLabel = "LAYOUT", description = "CODE or CODE@REVISION")
  private String name = "";

  LayoutProbe(Session session) {
    super(session);
  }

  private record Asked(RingDesign design, ProbeDesign probes) {}

  @Override
  int run() {
    Asked asked =
        session.read(
            book -> {
              RingDesign design = new Layouts(book).design(name);
              return new Asked(design, ProbedLayout.of(design, new Grades(book).list()));
            });
    Layout layout = asked.design().layout();
    ProbeReport own = asked.probes().ofLayout();
    ProbeReport fewest = asked.probes().cheapest();
    if (!session.json(ProbeJson.of(layout, own, fewest))) {
      session.say(text(layout, own, fewest));
    }
    return 0;
  }

  private String text(Layout layout, ProbeReport own, ProbeReport fewest) {
    ProbeWords say = new ProbeWords(session.words());
    List<String> parts = new ArrayList<>();
    parts.add(session.words().say("probe.head", LayoutShow.shown(layout), own.points().size()));
    parts.add(say.sentence(own));
    Table table = new Table("ONE", "OTHER", ">MISTAKEN", ">SUCH PAIRS");
    rows(table, say, own.singlesAlike(), layout);
    rows(table, say, own.pairsAlike(), layout);
    if (!table.isEmpty()) {
      parts.add(table.text());
    }
    parts.add(session.words().say("probe.proposed", fewest.points().size(), say.sentence(fewest)));
    parts.add(points(fewest.points()));
    return parts.stream()
        .flatMap(String::lines)
        .flatMap(line -> Table.broken(line, WIDTH).stream())
        .collect(Collectors.joining("\n"));
  }

  /// One row for all pairs that are alike by the ring's symmetry, as far as there is room.
  private void rows(Table table, ProbeWords say, List<ToldApart> alike, Layout layout) {
    Map<String, List<ToldApart>> kinds = new LinkedHashMap<>();
    for (ToldApart two : alike) {
      kinds.computeIfAbsent(say.kind(two, layout), k -> new ArrayList<>()).add(two);
    }
    int left = MOST_ROWS;
    for (List<ToldApart> kind : kinds.values()) {
      if (left-- > 0) {
        ToldApart first = kind.getFirst();
        table.row(
            say.faults(first.one()),
            say.faults(first.other()),
            ProbeWords.rate(first.errorRate()),
            kind.size());
      }
    }
    if (left < 0) {
      table.row(session.words().say("probe.more", -left), "", "", "");
    }
  }

  /// The points by spot and component: `centre radial: 2, 4, 6`.
  private static String points(List<ProbePoint> points) {
    Map<String, TreeSet<Integer>> bySort = new LinkedHashMap<>();
    for (ProbePoint point : points) {
      bySort
          .computeIfAbsent(
              LayoutWords.word(point.spot()) + " " + LayoutWords.word(point.component()),
              sort -> new TreeSet<>())
          .add(point.slot());
    }
    Table table = new Table("READING", "SLOTS");
    bySort.forEach(
        (sort, slots) ->
            table.row(sort, slots.stream().map(String::valueOf).collect(Collectors.joining(" "))));
    return table.text();
  }
}
