package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import lodebook.assembly.plan.MixPolicy;
import lodebook.db.builds.Batches;
import lodebook.db.builds.Plan;
import lodebook.db.builds.Plans;
import lodebook.db.builds.Rotor;
import lodebook.db.refusal.Refusal;
import lodebook.ui.craft.PlanWish;
import lodebook.ui.craft.PlannedRing;
import lodebook.ui.craft.Planning;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Plans which piece goes where, or drops plans.
@Command(
    name = "plan",
    description = "Plan which piece goes into which slot, which way and in which order.",
    footer = {"", "Example:", "  lodebook plan R-0001 --from L-2404"})
final class PlanCommand extends Verb {
  private static final String VERSION = "0.1.0";

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

  @Option(names = "--seconds", paramLabel = "S", description = "how long to search")
  private @Nullable Double seconds;

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
        new PlanWish(wanted, lots, MixPolicy.valueOf(mix.toUpperCase(Locale.ROOT)), seed, seconds);
    FillWords fill = new FillWords(session.words());
    List<Plan> plans = new Planning(session::opened, fill::of, VERSION).plan(session.act(), wish);
    List<PlannedRing> rings =
        session.read(book -> plans.stream().map(p -> PlannedRing.of(book, p)).toList());
    List<Json> documents = rings.stream().map(PlanJson::of).toList();
    boolean several = batch != null || wanted.size() > 1;
    Json document = several ? Json.object().put("plans", documents) : documents.getFirst();
    if (!session.json(document)) {
      PlanWords words = new PlanWords(session.words());
      session.say(rings.stream().map(words::of).collect(Collectors.joining("\n\n")));
    }
    session.tellBook(session.address());
    session.next(
        "lodebook paper traveller " + wanted.getFirst() + " -o " + wanted.getFirst() + ".pdf");
    return 0;
  }
}
