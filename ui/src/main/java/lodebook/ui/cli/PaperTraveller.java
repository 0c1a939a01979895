package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.reports.traveller.TravellerSheet;
import lodebook.ui.paper.Travellers;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Prints the traveller of a rotor.
@Command(
    name = "traveller",
    description = "Print the traveller of a rotor: what goes where, which way, what to expect.",
    footer = {"", "Example:", "  lodebook paper traveller R-0001 -o R-0001.pdf"})
final class PaperTraveller extends Verb {
  @Parameters(paramLabel = "ROTOR", description = "its number")
  private String rotor = "";

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
    Travellers.Material material =
        session.read(book -> Travellers.read(book, rotor, session.facts(book)));
    OutputFile.write(file, TravellerSheet.pdf(Travellers.of(material)));
    session.done("traveller.written", rotor, file);
    session.next("lodebook place " + rotor + " placements.csv");
    return 0;
  }
}
