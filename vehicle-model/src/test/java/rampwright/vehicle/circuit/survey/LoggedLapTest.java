package rampwright.vehicle.circuit.survey;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.circuit.Station;

class LoggedLapTest {
  /** Arc of radius R at speed v: lateral acceleration v²/R, length 2πR. */
  @Test
  @Tag("validation")
  void aCircleDrivenAtChangingSpeedComesBackAsACircle() {
    double radius = 80;
    double length = 2 * Math.PI * radius;
    String log =
        LogText.lap(s -> 1 / radius, s -> 20 + 5 * Math.sin(2 * Math.PI * s / length), length, 50);
    ImportedCircuit imported = LogText.read(log);
    // the lap is taken to end one sample after its last one: at most one sample of 0.4 m too long
    assertThat(imported.circuit().length()).isCloseTo(length, within(0.4));
    for (Station station : imported.circuit().stations()) {
      assertThat(1 / station.curvature()).isCloseTo(radius, within(0.0015 * radius));
    }
    assertThat(imported.report().get(Figure.TURNING_AFTER).orElseThrow())
        .isCloseTo(360, within(1e-9));
    assertThat(imported.report().get(Figure.GAP_AFTER).orElseThrow()).isLessThan(1e-6);
  }

  @Test
  void theReportSaysWhatWasDone() {
    double length = 2 * Math.PI * 80;
    ImportReport report = LogText.read(LogText.lap(s -> -1 / 80.0, s -> 20, length, 50)).report();
    assertThat(report.source()).isEqualTo("logged lap");
    assertThat(report.get(Figure.SAMPLE_RATE).orElseThrow()).isCloseTo(50, within(0.01));
    assertThat(report.get(Figure.TURNING_AFTER).orElseThrow()).isCloseTo(-360, within(1e-9));
    assertThat(report.text())
        .startsWith("lap.csv: logged lap\n")
        .contains("smoothing length: 15.0 m\n")
        .contains("Columns: time=time[s], speed=speed[m/s], lateral_acceleration=ay[m/s2].\n");
    assertThat(report.warnings()).isEmpty();
  }

  @Test
  void thePlotHasMapSpeedAndCurvatureWithUnits() {
    String log = LogText.lap(s -> 1 / 80.0, s -> 20, 2 * Math.PI * 80, 50);
    String svg =
        ImportPlot.svg(
            CircuitImport.read("a<b.csv", LogText.stream(log), ImportOptions.defaults()));
    assertThat(svg)
        .startsWith("<svg xmlns=\"http://www.w3.org/2000/svg\"")
        .contains("logged speed (km/h)", "curvature (1/m)", "distance (m)", "Circuit a&lt;b")
        .doesNotContain("NaN", "a<b");
  }
}
