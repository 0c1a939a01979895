package lodebook.reports.sheet;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import lodebook.reports.canvas.Png;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.rendering.ImageType;
import org.apache.pdfbox.rendering.PDFRenderer;

/// Pictures of a sheet's pages.
public final class PagePictures {
  private PagePictures() {}

  /// Every page of a PDF as a PNG file.
  ///
  /// @param dotsPerInch resolution
  /// @param grey whether the picture shows what a printer without colours prints
  public static List<byte[]> of(byte[] pdf, float dotsPerInch, boolean grey) {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      var renderer = new PDFRenderer(document);
      List<byte[]> pictures = new ArrayList<>();
      for (int page = 0; page < document.getNumberOfPages(); page++) {
        ImageType type = grey ? ImageType.GRAY : ImageType.RGB;
        pictures.add(Png.of(renderer.renderImageWithDPI(page, dotsPerInch, type)));
      }
      return pictures;
    } catch (IOException broken) {
      throw new UncheckedIOException(broken);
    }
  }
}
