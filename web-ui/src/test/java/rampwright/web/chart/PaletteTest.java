package rampwright.web.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The colours of the style sheet, seen with each of the three dichromacies. Matrices: Machado,
 * Oliveira and Fernandes, <i>A Physiologically-based Model for Simulation of Color Vision
 * Deficiency</i>, IEEE TVCG 15 (2009), severity 1.0, from memory. Contrast: WCAG 2.2, success
 * criterion 1.4.11. Colour difference: CIE 1976 in L*a*b* (ISO/CIE 11664-4).
 */
@Tag("validation")
class PaletteTest {
  private static final Path STYLES = Path.of("src/main/frontend/themes/rampwright/styles.css");

  /** Several times the difference that an eye just notices (about 2.3). */
  private static final double APART = 15;

  private static final double WCAG_CONTRAST = 3;

  private static final List<double[][]> EYES =
      List.of(
          new double[][] {{1, 0, 0}, {0, 1, 0}, {0, 0, 1}},
          new double[][] {
            {0.152286, 1.052583, -0.204868},
            {0.114503, 0.786281, 0.099216},
            {-0.003882, -0.048116, 1.051998}
          },
          new double[][] {
            {0.367322, 0.860646, -0.227968},
            {0.280085, 0.672501, 0.047413},
            {-0.011820, 0.042940, 0.968881}
          },
          new double[][] {
            {1.255528, -0.076749, -0.178779},
            {-0.078411, 0.930809, 0.147602},
            {0.004733, 0.691367, 0.303900}
          });

  @ParameterizedTest
  @ValueSource(strings = {"html {", "html[theme~=\"dark\"] {"})
  void settingsStayApartForEveryEyeAndStandOutFromThePaper(String paper) throws IOException {
    String style = Files.readString(STYLES);
    String block = style.substring(style.indexOf(paper));
    double[] sheet = colour(block, "--rw-sheet");
    List<double[]> lines =
        IntStream.range(0, Palette.SIZE).mapToObj(i -> colour(block, Palette.colour(i))).toList();
    for (double[][] eye : EYES) {
      for (int i = 0; i < lines.size(); i++) {
        for (int j = 0; j < i; j++) {
          double difference =
              difference(lab(seen(eye, lines.get(i))), lab(seen(eye, lines.get(j))));
          assertThat(difference).as("colours %d and %d", j + 1, i + 1).isGreaterThan(APART);
        }
      }
    }
    assertThat(lines).allMatch(line -> contrast(line, sheet) >= WCAG_CONTRAST);
  }

  private static double[] colour(String block, String name) {
    Matcher matcher = Pattern.compile(name + ": #(..)(..)(..);").matcher(block);
    assertThat(matcher.find()).as(name).isTrue();
    return Stream.of(1, 2, 3)
        .mapToDouble(i -> linear(Integer.parseInt(matcher.group(i), 16) / 255.0))
        .toArray();
  }

  private static double linear(double value) {
    return value <= 0.04045 ? value / 12.92 : Math.pow((value + 0.055) / 1.055, 2.4);
  }

  private static double[] seen(double[][] eye, double[] rgb) {
    double[] seen = new double[3];
    for (int i = 0; i < 3; i++) {
      double sum = eye[i][0] * rgb[0] + eye[i][1] * rgb[1] + eye[i][2] * rgb[2];
      seen[i] = Math.max(0, Math.min(1, sum));
    }
    return seen;
  }

  private static double luminance(double[] rgb) {
    return 0.2126 * rgb[0] + 0.7152 * rgb[1] + 0.0722 * rgb[2];
  }

  private static double contrast(double[] a, double[] b) {
    double high = Math.max(luminance(a), luminance(b));
    double low = Math.min(luminance(a), luminance(b));
    return (high + 0.05) / (low + 0.05);
  }

  private static double[] lab(double[] rgb) {
    double x = root((0.4124564 * rgb[0] + 0.3575761 * rgb[1] + 0.1804375 * rgb[2]) / 0.95047);
    double y = root(0.2126729 * rgb[0] + 0.7151522 * rgb[1] + 0.0721750 * rgb[2]);
    double z = root((0.0193339 * rgb[0] + 0.1191920 * rgb[1] + 0.9503041 * rgb[2]) / 1.08883);
    return new double[] {116 * y - 16, 500 * (x - y), 200 * (y - z)};
  }

  private static double root(double t) {
    return t > 216.0 / 24389 ? Math.cbrt(t) : (24389.0 / 27 * t + 16) / 116;
  }

  private static double difference(double[] a, double[] b) {
    return Math.sqrt(IntStream.range(0, 3).mapToDouble(i -> (a[i] - b[i]) * (a[i] - b[i])).sum());
  }
}
