package lodebook.reports.sheet;

import java.io.ByteArrayInputStream;
import java.util.List;
import org.verapdf.gf.foundry.VeraGreenfieldFoundryProvider;
import org.verapdf.pdfa.Foundries;
import org.verapdf.pdfa.PDFAParser;
import org.verapdf.pdfa.flavours.PDFAFlavour;

/// Asks veraPDF, a validator of its own, whether a file is PDF/A-2b.
public final class Archive {
  private Archive() {}

  /// What the validator finds wrong; empty for a good file.
  public static List<String> faults(byte[] pdf) throws Exception {
    VeraGreenfieldFoundryProvider.initialise();
    try (PDFAParser parser =
            Foundries.defaultInstance()
                .createParser(new ByteArrayInputStream(pdf), PDFAFlavour.PDFA_2_B);
        var validator = Foundries.defaultInstance().createValidator(PDFAFlavour.PDFA_2_B, false)) {
      return validator.validate(parser).getTestAssertions().stream()
          .map(a -> a.getRuleId().getClause() + ": " + a.getMessage())
          .distinct()
          .toList();
    }
  }
}
