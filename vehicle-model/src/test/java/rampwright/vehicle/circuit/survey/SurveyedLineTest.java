package rampwright.vehicle.circuit.survey;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Station;

class SurveyedLineTest {
  private static ImportedCircuit read(String name, String text, ImportOptions options) {
    return CircuitImport.read(name, LogText.stream(text), options);
  }

  /** Rows x, y at {@code n} values of a parameter from 0, {@code step} apart. */
  private static String rows(int n, double step, DoubleUnaryOperator x, DoubleUnaryOperator y) {
    StringBuilder text = new StringBuilder("x_m,y_m\n");
    for (int i = 0; i < n; i++) {
      double t = i * step;
      text.append(
          String.format(Locale.ROOT, "%.9f,%.9f\n", x.applyAsDouble(t), y.applyAsDouble(t)));
    }
    return text.toString();
  }

  /** Polygon of n corners in a circle: {@code 2 n R sin(pi/n)}. */
  @Test
  @Tag("validation")
  void aCircleHasItsRadiusAndTheLengthBetweenChordsAndArc() {
    double radius = 60;
    int n = 75;
    double step = 2 * Math.PI / n;
    String rows = rows(n, step, t -> radius * Math.cos(t), t -> radius * Math.sin(t));
    ImportedCircuit imported = read("ring.csv", rows, ImportOptions.defaults());
    ImportReport report = imported.report();
    double chords = 2 * n * radius * Math.sin(Math.PI / n);
    assertThat(report.get(Figure.LENGTH_OF_CHORDS).orElseThrow()).isCloseTo(chords, within(1e-6));
    double arc = 2 * Math.PI * radius;
    assertThat(report.get(Figure.LENGTH_OF_CURVE).orElseThrow()).isCloseTo(arc, within(1e-4));
    assertThat(report.get(Figure.TURNING_BEFORE).orElseThrow()).isCloseTo(360, within(1e-6));
    for (Station station : imported.circuit().stations()) {
      assertThat(station.curvature()).isCloseTo(1 / radius, within(1e-6));
      assertThat(Math.hypot(station.x(), station.y())).isCloseTo(radius, within(1e-3));
    }
  }

  /**
   * Ellipse: curvature {@code ab/(a² sin² + b² cos²)^1.5}; length by Ramanujan's second formula.
   */
  @Test
  @Tag("validation")
  void anEllipseHasItsCurvatureAndLength() {
    double a = 150;
    double b = 100;
    int n = 160;
    double step = 2 * Math.PI / n;
    String rows = rows(n, step, t -> a * Math.cos(t), t -> b * Math.sin(t));
    Circuit circuit =
        read("ellipse.csv", rows, ImportOptions.defaults().withSmoothing(0)).circuit();
    double h = Math.pow((a - b) / (a + b), 2);
    double length = Math.PI * (a + b) * (1 + 3 * h / (10 + Math.sqrt(4 - 3 * h)));
    assertThat(circuit.length()).isCloseTo(length, within(1e-3));
    for (Station station : circuit.stations()) {
      double t = Math.atan2(station.y() / b, station.x() / a);
      double sin = Math.sin(t);
      double cos = Math.cos(t);
      double curvature = a * b / Math.pow(a * a * sin * sin + b * b * cos * cos, 1.5);
      assertThat(station.curvature()).isCloseTo(curvature, within(1e-5));
    }
  }

  /**
   * Clothoid {@code kappa = pi s / A²}, so that {@code x = A C(s/A)}, {@code y = A S(s/A)}.
   * Abramowitz and Stegun, <i>Handbook of Mathematical Functions</i>, table 7.7: C(1) = 0.7798934,
   * S(1) = 0.4382591 (from memory).
   */
  @Test
  @Tag("validation")
  void aClothoidHasCurvatureInProportionToItsLength() {
    double scale = 200;
    assertThat(fresnel(1, true)).isCloseTo(0.7798934, within(5e-8));
    assertThat(fresnel(1, false)).isCloseTo(0.4382591, within(5e-8));
    String rows =
        rows(51, 4, s -> scale * fresnel(s / scale, true), s -> scale * fresnel(s / scale, false));
    Circuit circuit =
        read("spiral.csv", rows, ImportOptions.defaults().withClosed(false)).circuit();
    assertThat(circuit.closed()).isFalse();
    // the spline is free of curvature at both ends, which is felt over a few points
    assertThat(circuit.length()).isCloseTo(scale, within(2e-3));
    for (Station station : circuit.stations()) {
      if (station.distance() > 16 && station.distance() < scale - 16) {
        double curvature = Math.PI * station.distance() / scale / scale;
        assertThat(station.curvature()).isCloseTo(curvature, within(3e-5));
      }
    }
  }

  /** Power series of the Fresnel integrals C and S (Abramowitz and Stegun 7.3.11, 7.3.13). */
  private static double fresnel(double z, boolean cosine) {
    double sum = 0;
    double quarter = Math.PI / 2 * z * z;
    double term = cosine ? z : z * quarter;
    for (int n = 0; n < 30; n++) {
      int power = cosine ? 2 * n : 2 * n + 1;
      sum += term / (2 * power + 1);
      term *= -quarter * quarter / ((power + 1.0) * (power + 2.0));
    }
    return sum;
  }

  @Test
  void aLineRecordedPastItsStartIsCutThere() {
    double radius = 100;
    double step = 3 / radius;
    String rows = rows(230, step, t -> radius * Math.cos(t), t -> radius * Math.sin(t));
    ImportedCircuit imported = read("ring.csv", rows, ImportOptions.defaults());
    assertThat(imported.circuit().length()).isCloseTo(2 * Math.PI * radius, within(0.01));
    assertThat(imported.report().text())
        .contains("points after the line had come back to its start were cut.");
  }

  @Test
  void heightsGiveTheGrade() {
    double radius = 200;
    double hill = 10;
    StringBuilder rows = new StringBuilder("x_m,y_m,elevation_m\n");
    int n = 300;
    for (int i = 0; i < n; i++) {
      double t = 2 * Math.PI * i / n;
      rows.append(
          String.format(
              Locale.ROOT,
              "%.6f,%.6f,%.6f\n",
              radius * Math.cos(t),
              radius * Math.sin(t),
              300 + hill * Math.sin(t)));
    }
    ImportedCircuit imported = read("hill.csv", rows.toString(), ImportOptions.defaults());
    for (Station station : imported.circuit().stations()) {
      double t = station.distance() / radius;
      double grade = Math.atan(hill / radius * Math.cos(t));
      assertThat(station.grade()).isCloseTo(grade, within(2e-4));
    }
    assertThat(imported.report().get(Figure.CLIMB).orElseThrow()).isCloseTo(2 * hill, within(0.02));
  }
}
