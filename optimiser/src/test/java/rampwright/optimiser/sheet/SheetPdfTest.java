package rampwright.optimiser.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;

class SheetPdfTest {
  private static byte[] pdf(SetupSheet sheet) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    SheetPdf.write(sheet, out);
    return out.toByteArray();
  }

  /** Returns the words of the only page, each run of blanks as one. */
  private static String words(byte[] pdf) throws IOException {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      assertThat(document.getNumberOfPages()).isEqualTo(1);
      PDRectangle page = document.getPage(0).getMediaBox();
      assertThat(page.getWidth()).isBetween(594f, 596f);
      assertThat(page.getHeight()).isBetween(841f, 843f);
      PDFTextStripper stripper = new PDFTextStripper();
      stripper.setSortByPosition(false);
      return stripper.getText(document).replaceAll("[\\s\u00a0]+", " ");
    }
  }

  @Test
  void everySectionIsOnTheOnePage() throws IOException {
    byte[] pdf = pdf(SampleSheets.sheet());
    assertThat(words(pdf))
        .contains("SETUP SHEET · PLATE DIFFERENTIAL · REAR AXLE")
        .contains("harder")
        .contains("Event: Club race")
        .contains("Car: Corvane T4")
        .contains("Change from “as raced”, now in the car")
        .contains("grip 0.95, fuel 30 kg, air 1.225 kg/m³, wind 3 m/s from 90°")
        .contains("40/80")
        .contains("events/skid pan 2 9.778 s 9.778 s 0.000 s 0.000 to 0.000 s")
        .contains("NOT turned, stamped 40° / 80°")
        .contains("40° / 80° drive / coast")
        .contains("Friction faces per side 8")
        .contains("80 N·m")
        .contains("3 × (C G), C, 2 G, 2 C")
        .contains("one wheel held, turn the other 40 34 – 46")
        .contains("turn the other backwards holds do not force")
        .contains("Ring set: take out 45/60, fit 40/80 not turned.")
        .contains("mm on each side to start with")
        .contains("Disc springs 1 parallel × 2 in series, 100 × 72 × 3, cone height 1.8 mm")
        .contains("Breaks limits of the event: preload, drive locking share.")
        .contains("Time needed: 60 min")
        .contains("preload ≥ 90 N·m 80 N·m BROKEN")
        .contains("coast locking share ≤ 0.2")
        .contains("The maker's manual and torque figures prevail")
        .contains("on stands")
        .contains("Eye protection")
        .contains("licensed")
        .contains("Built by (name, date, signature)")
        .contains("Unit no.")
        .contains("Notes of crew and driver");
  }

  @Test
  void theSameSheetGivesTheSameBytes() throws IOException {
    SetupSheet sheet = SampleSheets.sheet();
    assertThat(pdf(sheet)).isEqualTo(pdf(sheet));
  }

  @Test
  void twoCircuitsWithTwelveCornersAndLongNamesFit() throws IOException {
    String name = "of an unusually long name that somebody typed with patience and care, part two";
    String words = words(pdf(SampleSheets.full(2, 12, 3, name)));
    assertThat(words)
        .contains("setting " + name)
        .contains("circuit 2 " + name)
        .contains("corner by corner")
        .contains("12 2532 115 −0.012 cornering speed")
        .contains("elsewhere 0.000")
        .contains("licensed")
        .contains("Released by");
    assertThat(words.split("locking share")).hasSize(9);
  }

  @Test
  void cornersThatFindNoRoomAreSummed() throws IOException {
    String words = words(pdf(SampleSheets.full(6, 40, 8, "x".repeat(300))));
    assertThat(words).contains("more corners and elsewhere").contains("…").contains("Released by");
  }

  @Test
  void wordsThatLookLikeMarkupAreWords() throws IOException {
    assertThat(words(pdf(SampleSheets.full(1, 1, 1, "<b>&amp;'\"\u0001 Ω"))))
        .contains("setting <b>&amp;'\" Ω");
  }
}
