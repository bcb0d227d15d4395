package rampwright.optimiser.sheet;

import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FontStyle;
import com.openhtmltopdf.pdfboxout.PdfBoxRenderer;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder;
import com.openhtmltopdf.svgsupport.BatikSVGDrawer;
import com.openhtmltopdf.util.XRLog;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentInformation;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.PDPageContentStream.AppendMode;

/**
 * Sets a sheet on one A4 page. The same sheet gives the same bytes: no date is printed or stored.
 *
 * <p>Where the content does not fit, the type becomes smaller step by step, and in the end the
 * corners that differ least are summed in one line.
 */
public final class SheetPdf {
  /** Font sizes (pt) and most corners for one circuit, tried in this order. */
  private enum Fit {
    LARGE(8.8, 40),
    USUAL(8.1, 40),
    SMALLER(7.4, 40),
    SMALL(6.8, 40),
    SMALLEST(6.2, 40),
    FEW_CORNERS(6.2, 10),
    NO_CORNERS(5.8, 0);

    private final double size;
    private final int corners;

    Fit(double size, int corners) {
      this.size = size;
      this.corners = corners;
    }
  }

  private static final float MILLIMETRE = 72 / 25.4f;

  /** Margins of the page (pt), as in the style sheet. */
  private static final float SIDE_MARGIN = 10 * MILLIMETRE;

  private static final float LOWER_MARGIN = 7 * MILLIMETRE;

  /** Height of a line to write on (pt). */
  private static final float NOTE_LINE = 7 * MILLIMETRE;

  private SheetPdf() {}

  /**
   * Writes a sheet.
   *
   * @param sheet the content
   * @param out receives the PDF; not closed
   * @throws IOException when it cannot be written
   */
  public static void write(SetupSheet sheet, OutputStream out) throws IOException {
    String style = new String(resource("sheet.css"), StandardCharsets.UTF_8);
    for (Fit fit : Fit.values()) {
      try (PdfBoxRenderer renderer = renderer(SheetHtml.of(sheet, style, fit.size, fit.corners))) {
        renderer.createPDFWithoutClosing();
        PDDocument document = renderer.getPdfDocument();
        if (document.getNumberOfPages() == 1) {
          ruleNotes(document, renderer.getLastContentBottom());
          save(document, out);
          return;
        }
      }
    }
    throw new IOException("The setup sheet does not fit on one page.");
  }

  private static PdfBoxRenderer renderer(String html) {
    XRLog.setLoggingEnabled(false);
    PdfRendererBuilder builder = new PdfRendererBuilder();
    builder.useFont(() -> open("fonts/DejaVuSans.ttf"), "DejaVu Sans", 400, FontStyle.NORMAL, true);
    builder.useFont(
        () -> open("fonts/DejaVuSans-Bold.ttf"), "DejaVu Sans", 700, FontStyle.NORMAL, true);
    builder.useSVGDrawer(new BatikSVGDrawer());
    builder.withHtmlContent(html, null);
    return builder.buildPdfRenderer();
  }

  /** Rules the rest of the page for notes, from a height above its lower edge (pt) downwards. */
  private static void ruleNotes(PDDocument document, float from) throws IOException {
    float right = document.getPage(0).getMediaBox().getWidth() - SIDE_MARGIN;
    try (PDPageContentStream lines =
        new PDPageContentStream(document, document.getPage(0), AppendMode.APPEND, true, true)) {
      lines.setLineWidth(0.4f);
      for (float y = from; y > LOWER_MARGIN; y -= NOTE_LINE) {
        lines.moveTo(SIDE_MARGIN, y);
        lines.lineTo(right, y);
      }
      lines.stroke();
    }
  }

  private static void save(PDDocument document, OutputStream out) throws IOException {
    PDDocumentInformation information = new PDDocumentInformation();
    information.setTitle(document.getDocumentInformation().getTitle());
    information.setProducer("Rampwright");
    document.setDocumentInformation(information);
    // otherwise the identifier is made from the time of day
    document.setDocumentId(0L);
    document.save(out);
  }

  private static byte[] resource(String name) throws IOException {
    try (InputStream in = open(name)) {
      return in.readAllBytes();
    }
  }

  private static InputStream open(String name) {
    InputStream in = SheetPdf.class.getResourceAsStream(name);
    if (in == null) {
      throw new UncheckedIOException(new IOException("missing in the jar: " + name));
    }
    return in;
  }
}
