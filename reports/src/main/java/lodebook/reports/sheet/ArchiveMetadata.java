package lodebook.reports.sheet;

import java.awt.color.ColorSpace;
import java.awt.color.ICC_Profile;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.GregorianCalendar;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.common.PDMetadata;
import org.apache.pdfbox.pdmodel.graphics.color.PDOutputIntent;
import org.apache.pdfbox.pdmodel.interactive.viewerpreferences.PDViewerPreferences;

/// Marks a document as PDF/A-2b (ISO 19005-2) with dates and identifier from the sheet's facts.
final class ArchiveMetadata {
  private static final String PROGRAM = "Lodebook";

  private ArchiveMetadata() {}

  static void write(PDDocument document, String title, SheetFacts facts) throws IOException {
    document.setVersion(1.7f);
    document.setDocumentId(identifier(title, facts));
    var information = document.getDocumentInformation();
    information.setTitle(title);
    information.setCreator(PROGRAM);
    information.setProducer(PROGRAM);
    var printed =
        GregorianCalendar.from(
            facts.printedAt().withOffsetSameInstant(ZoneOffset.UTC).toZonedDateTime());
    information.setCreationDate(printed);
    information.setModificationDate(printed);
    var catalog = document.getDocumentCatalog();
    catalog.setLanguage(facts.language().toLanguageTag());
    var preferences = new PDViewerPreferences(new COSDictionary());
    preferences.setDisplayDocTitle(true);
    catalog.setViewerPreferences(preferences);
    var metadata = new PDMetadata(document);
    metadata.importXMPMetadata(xmp(title, facts).getBytes(StandardCharsets.UTF_8));
    catalog.setMetadata(metadata);
    byte[] profile = ICC_Profile.getInstance(ColorSpace.CS_sRGB).getData();
    var intent = new PDOutputIntent(document, new ByteArrayInputStream(profile));
    intent.setInfo("sRGB IEC61966-2.1");
    intent.setOutputCondition("sRGB IEC61966-2.1");
    intent.setOutputConditionIdentifier("sRGB IEC61966-2.1");
    intent.setRegistryName("http://www.color.org");
    catalog.addOutputIntent(intent);
  }

  private static long identifier(String title, SheetFacts facts) {
    try {
      byte[] hash =
          MessageDigest.getInstance("SHA-256")
              .digest((title + facts).getBytes(StandardCharsets.UTF_8));
      return ByteBuffer.wrap(hash).getLong();
    } catch (NoSuchAlgorithmException impossible) {
      throw new IllegalStateException("every Java has SHA-256", impossible);
    }
  }

  private static String xmp(String title, SheetFacts facts) {
    String date =
        DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss'Z'")
            .format(facts.printedAt().withOffsetSameInstant(ZoneOffset.UTC));
    return """
    <?xpacket begin="\uFEFF" id="W5M0MpCehiHzreSzNTczkc9d"?>
    <x:xmpmeta xmlns:x="adobe:ns:meta/">
     <rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#">
      <rdf:Description rdf:about=""
        xmlns:dc="http://purl.org/dc/elements/1.1/"
        xmlns:pdf="http://ns.adobe.com/pdf/1.3/"
        xmlns:xmp="http://ns.adobe.com/xap/1.0/"
        xmlns:pdfaid="http://www.aiim.org/pdfa/ns/id/">
       <pdfaid:part>2</pdfaid:part>
       <pdfaid:conformance>B</pdfaid:conformance>
       <dc:format>application/pdf</dc:format>
       <dc:title><rdf:Alt><rdf:li xml:lang="x-default">%s</rdf:li></rdf:Alt></dc:title>
       <xmp:CreatorTool>%s</xmp:CreatorTool>
       <xmp:CreateDate>%s</xmp:CreateDate>
       <xmp:ModifyDate>%s</xmp:ModifyDate>
       <pdf:Producer>%s</pdf:Producer>
      </rdf:Description>
     </rdf:RDF>
    </x:xmpmeta>
    <?xpacket end="w"?>
    """
        .formatted(escaped(title), PROGRAM, date, date, PROGRAM);
  }

  private static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
  }
}
