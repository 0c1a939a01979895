package lodebook.ui.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.survey.Verdict;
import lodebook.reports.traveller.TravellerSheet;
import lodebook.ui.craft.PlannedRing;
import lodebook.ui.paper.Travellers;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Prints the travellers of rotors.
@Command(
    name = "traveller",
    description = "Print travellers of rotors: what goes where, which way, what to expect.",
    footer = {"", "Example:", "  lodebook paper traveller R-0001 R-0002 -o travellers.pdf"})
final class PaperTraveller extends Verb {
  @Parameters(
      arity = "1..*",
      paramLabel = "ROTOR",
      description = "their numbers, in the order of the pages")
  private List<String> rotors = List.of();

  @Option(
      names = {"-o", "--output"},
      paramLabel = "FILE",
      required = true,
      description = "the PDF file")
  private Path file = Path.of("traveller.pdf");

  PaperTraveller(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<Travellers.Material> materials =
        session.read(
            book ->
                rotors.stream()
                    .map(rotor -> Travellers.read(book, rotor, session.facts(book)))
                    .toList());
    OutputFile.write(
        file,
        TravellerSheet.pdf(materials.stream().map(m -> Travellers.of(m, planned(m))).toList()));
    List<String> shown = materials.stream().map(m -> m.shown().rotor().code()).toList();
    session.done("traveller.written", String.join(", ", shown), file, shown.size());
    session.next("lodebook place " + shown.getFirst() + " placements.csv");
    return 0;
  }

  private List<String> planned(Travellers.Material material) {
    List<String> sentences = new ArrayList<>();
    PlannedRing ring = material.ring();
    if (ring != null) {
      PlanWords words = new PlanWords(session.words());
      sentences.add(words.order(ring) + ".");
      sentences.add(words.head(ring.plan()) + ".");
    }
    String survey = material.shown().rotor().latestSurvey();
    if (survey != null) {
      Verdict verdict = material.verdict();
      sentences.add(
          verdict == null
              ? session.words().say("rotor.survey-unchecked", survey) + "."
              : session.words().say("traveller.survey", survey, verdict.word()) + ".");
    }
    return sentences;
  }
}
