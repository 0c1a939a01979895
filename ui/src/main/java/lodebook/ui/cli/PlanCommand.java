package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import lodebook.assembly.plan.MixPolicy;
import lodebook.assembly.plan.RotorPlan;
import lodebook.db.builds.Batches;
import lodebook.db.builds.MagnetName;
import lodebook.db.builds.Plans;
import lodebook.db.builds.Rotor;
import lodebook.db.refusal.Refusal;
import lodebook.ui.craft.BuiltVersion;
import lodebook.ui.craft.FillWords;
import lodebook.ui.craft.PlanWish;
import lodebook.ui.craft.Planned;
import lodebook.ui.craft.PlannedRing;
import lodebook.ui.craft.Planning;
import lodebook.ui.craft.WhatIf;
import lodebook.ui.words.Amounts;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Plans which piece goes where, or drops plans.
@Command(
    name = "plan",
    description = "Plan which piece goes into which slot, which way and in which order.",
    footer = {
      "",
      "Example:",
      "  lodebook plan R-0001 --from L-2404",
      "  lodebook plan --batch B-31 --from L-1,L-2,L-3 --apart L-1,L-3 --compare",
      "  lodebook plan R-7 --from L-1 --keep-for R-7=L-1/0017,L-1/0018"
    })
final class PlanCommand extends Verb {
  @Parameters(arity = "0..*", paramLabel = "ROTOR", description = "open rotors")
  private List<String> rotors = new ArrayList<>();

  @Option(names = "--batch", paramLabel = "BATCH", description = "all its rotors that are not full")
  private @Nullable String batch;

  @Option(names = "--from", paramLabel = "LOT", split = ",", description = "lots to take from")
  private List<String> lots = new ArrayList<>();

  @Option(
      names = "--mix",
      paramLabel = "HOW",
      description = "lots in one rotor: never, few (default) or free")
  private String mix = "few";

  @Option(names = "--seed", paramLabel = "N", description = "the same seed gives the same plan")
  private long seed = 1;

  @Option(
      names = "--seconds",
      paramLabel = "S",
      description = "how long to search at most; the best so far is kept")
  private @Nullable Double seconds;

  @Option(
      names = "--apart",
      paramLabel = "LOT,LOT",
      description = "lots that must not be mixed in one rotor; may be given several times")
  private List<String> apart = new ArrayList<>();

  @Option(
      names = "--keep-for",
      paramLabel = "ROTOR=PIECE[,PIECE]",
      description =
          "pieces for one rotor only: it must have them where it is planned, others must not; may be"
              + " given several times")
  private List<String> keepFor = new ArrayList<>();

  @Option(
      names = "--without",
      paramLabel = "PIECE",
      split = ",",
      description = "pieces that are not used")
  private List<String> without = new ArrayList<>();

  @Option(
      names = "--compare",
      description = "what if: as they come, sorted and planned side by side; stores nothing")
  private boolean compare;

  @Option(
      names = "--progress",
      description = "tell the best so far although standard error is no terminal")
  private boolean progress;

  @Option(names = "--drop", description = "drop the plans; what isn't built is free again")
  private boolean drop;

  PlanCommand(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<String> known =
        Arrays.stream(MixPolicy.values()).map(m -> m.name().toLowerCase(Locale.ROOT)).toList();
    if (!known.contains(mix)) {
      throw wrongLine("line.not-one-of", "--mix", mix, String.join(", ", known));
    }
    if (rotors.isEmpty() == (batch == null)) {
      throw wrongLine("line.missing", "ROTOR or --batch");
    }
    List<String> wanted = wanted();
    if (drop) {
      session.change(book -> new Plans(book).drop(session.act(), wanted));
      session.done("plan.dropped", String.join(", ", wanted), wanted.size());
      session.next("lodebook plan " + String.join(" ", wanted) + " --from LOT");
      return 0;
    }
    if (lots.isEmpty()) {
      throw wrongLine("line.missing", "--from LOT");
    }
    if (seconds != null && !(seconds > 0)) {
      throw wrongLine(
          "line.not-read", "--seconds", seconds, session.words().say("line.above-zero"));
    }
    return plan(wanted);
  }

  private List<String> wanted() {
    String of = batch;
    if (of == null) {
      return rotors;
    }
    List<String> found =
        session.read(book -> new Batches(book).show(of)).rotors().stream()
            .filter(r -> r.state().equals("open") && r.unit() == null)
            .filter(r -> drop ? r.planned() : r.filled() < r.slots())
            .map(Rotor::code)
            .toList();
    if (found.isEmpty()) {
      throw Refusal.refused(drop ? "plan.batch-unplanned" : "plan.batch-full", of)
          .remedy("lodebook batch show " + of);
    }
    return found;
  }

  private int plan(List<String> wanted) {
    PlanWish wish =
        new PlanWish(
            wanted,
            lots,
            MixPolicy.valueOf(mix.toUpperCase(Locale.ROOT)),
            apart(),
            keptFor(),
            Set.copyOf(without),
            seed,
            seconds);
    Planning planning =
        new Planning(
            session::opened,
            new FillWords(session.words()::say, force -> Amounts.fixed(force, 1)),
            BuiltVersion.text(),
            new PlanProgress(session, progress));
    boolean several = batch != null || wanted.size() > 1;
    return compare ? compare(planning, wish) : store(planning, wish, several);
  }

  private int compare(Planning planning, PlanWish wish) {
    WhatIf whatIf = planning.compare(wish);
    if (!session.json(PlanJson.of(whatIf))) {
      session.say(new CompareWords(session.words()).of(whatIf));
    }
    String what = batch == null ? String.join(" ", wish.rotors()) : "--batch " + batch;
    session.next("lodebook plan " + what + " --from " + String.join(",", lots));
    return 0;
  }

  private int store(Planning planning, PlanWish wish, boolean several) {
    Planned planned = planning.plan(session.act(), wish);
    PlanWords words = new PlanWords(session.words());
    if (session.common().json || !several) {
      List<PlannedRing> rings =
          session.read(book -> planned.plans().stream().map(p -> PlannedRing.of(book, p)).toList());
      PlannedRing first = rings.getFirst();
      RotorPlan computed = planned.computed().get(first.plan().rotor());
      if (session.common().json) {
        session.json(several ? PlanJson.together(rings, planned) : PlanJson.of(first, computed));
      } else {
        session.say(words.of(first, computed));
      }
    } else {
      session.say(words.together(planned));
    }
    if (planned.cutShort()) {
      session.warn(session.words().say("plan.cut-short"));
    }
    session.tellBook(session.address());
    String rotor = planned.plans().getFirst().rotor();
    session.next("lodebook paper traveller " + rotor + " -o " + rotor + ".pdf");
    return 0;
  }

  private List<Set<String>> apart() {
    List<Set<String>> groups = new ArrayList<>();
    for (String each : apart) {
      Set<String> group = new TreeSet<>(names(each));
      if (group.size() < 2) {
        throw wrongLine("plan.apart-form", each);
      }
      groups.add(group);
    }
    return groups;
  }

  private Map<String, String> keptFor() {
    Map<String, String> kept = new TreeMap<>();
    for (String each : keepFor) {
      int sign = each.indexOf('=');
      List<String> pieces = sign < 1 ? List.of() : names(each.substring(sign + 1));
      if (pieces.isEmpty()) {
        throw wrongLine("plan.keep-for-form", each);
      }
      String rotor = each.substring(0, sign).strip();
      for (String piece : pieces) {
        String before = kept.put(MagnetName.of(piece).toString(), rotor);
        if (before != null && !before.equalsIgnoreCase(rotor)) {
          throw wrongLine("plan.keep-for-twice", piece, before, rotor);
        }
      }
    }
    return kept;
  }

  private static List<String> names(String text) {
    return Arrays.stream(text.split(",", -1)).map(String::strip).filter(n -> !n.isEmpty()).toList();
  }
}
