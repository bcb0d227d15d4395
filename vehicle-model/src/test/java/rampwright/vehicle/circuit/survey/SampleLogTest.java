package rampwright.vehicle.circuit.survey;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.lap.Lap;

/** The logged lap among the samples against the circuit from which it was made. */
class SampleLogTest {
  private static final Circuit TRUTH = SampleCircuits.fast();

  /** Coarse (m), so that two laps take seconds: only their difference counts. */
  private static final double SPACING = 6;

  private static ImportedCircuit imported;

  @BeforeAll
  static void read() throws IOException {
    try (InputStream in = SampleFiles.open(SampleLog.PATH)) {
      imported = CircuitImport.read(SampleLog.PATH, in, ImportOptions.defaults());
    }
  }

  private static double figure(Figure figure) {
    return imported.report().get(figure).orElseThrow();
  }

  @Test
  void theCurvatureIsThatOfTheCircuitBehindTheLog() {
    List<Station> stations = imported.circuit().stations();
    double stretch = TRUTH.length() / imported.circuit().length();
    double spacing = TRUTH.length() / TRUTH.stations().size();
    double sum = 0;
    for (Station station : stations) {
      double s = station.distance() * stretch;
      int i = (int) (s / spacing);
      double share = s / spacing - i;
      double before = TRUTH.stations().get(i).curvature();
      double after = TRUTH.stations().get((i + 1) % TRUTH.stations().size()).curvature();
      double off = station.curvature() - (before + share * (after - before));
      // the tightest corner has 0.0167 1/m and is reached within 26 m: 3 m along the lap are 0.0019
      assertThat(off).isCloseTo(0, within(0.0025));
      sum += off * off;
    }
    assertThat(Math.sqrt(sum / stations.size())).isLessThan(4e-4);
  }

  @Test
  void theLapTimeOnAnImportedCircuitIsThatOnTheTrueOne() throws IOException {
    Lap truth = SampleLog.lap(TRUTH, SPACING);
    assertThat(SampleLog.lap(imported.circuit(), SPACING).time())
        .isCloseTo(truth.time(), Percentage.withPercentage(0.1));
    // the line has a point every 6 m, to the centimetre: its report advises four times as much
    try (InputStream in = SampleFiles.open(SampleLines.XY)) {
      ImportOptions options = ImportOptions.defaults().withSmoothing(24);
      Circuit line = CircuitImport.read(SampleLines.XY, in, options).circuit();
      assertThat(SampleLog.lap(line, SPACING).time())
          .isCloseTo(truth.time(), Percentage.withPercentage(0.1));
    }
  }

  @Test
  void theMadeUpErrorsOfTheSensorsAreFound() {
    assertThat(figure(Figure.DISTANCE_CORRECTION))
        .isCloseTo(-100 * SampleLog.SPEED_ERROR, within(0.15));
    assertThat(figure(Figure.LATERAL_OFFSET)).isCloseTo(SampleLog.LATERAL_OFFSET, within(0.02));
    assertThat(figure(Figure.SPIKES)).isEqualTo(2);
    assertThat(figure(Figure.LONGEST_DROPOUT)).isBetween(0.5, 0.7);
    assertThat(figure(Figure.LENGTH_BY_SPEED))
        .isCloseTo(TRUTH.length() * (1 + SampleLog.SPEED_ERROR), within(6.0));
  }

  @Test
  void theLineClosesAndLiesOnThePositions() {
    assertThat(figure(Figure.TURNING_BEFORE)).isCloseTo(-360, within(20.0));
    assertThat(figure(Figure.TURNING_AFTER)).isCloseTo(-360, within(1e-9));
    assertThat(figure(Figure.GAP_BEFORE)).isGreaterThan(1);
    assertThat(figure(Figure.GAP_AFTER)).isLessThan(1e-6);
    assertThat(imported.circuit().length()).isCloseTo(TRUTH.length(), within(6.0));
    // the receiver wanders by 0.7 m each way, one standard deviation
    assertThat(figure(Figure.POSITION_DEVIATION)).isBetween(0.5, 2.0);
  }
}
