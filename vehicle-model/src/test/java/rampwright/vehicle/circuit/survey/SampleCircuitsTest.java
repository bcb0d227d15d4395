package rampwright.vehicle.circuit.survey;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.circuit.Station;

class SampleCircuitsTest {
  /** Closest that two parts of a lap may come (m), twice the width of a narrow track. */
  private static final double APART = 16;

  static Stream<Arguments> samples() {
    return Stream.of(
        arguments("circuits/kestrelwick.csv", SampleCircuits.slow(), 1, 2300, 11),
        arguments("circuits/velmoor.csv", SampleCircuits.fast(), -1, 4000, 60),
        arguments("circuits/thornbeck.csv", SampleCircuits.hilly(), 1, 2600, 22));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("samples")
  @Tag("regression")
  void theFileIsWhatItsSegmentsGive(String file, Circuit made, int turns, double length, double r)
      throws IOException {
    try (InputStream in = SampleFiles.open(file)) {
      assertThat(new String(in.readAllBytes(), StandardCharsets.UTF_8))
          .isEqualTo(StationCsv.write(made));
    }
    assertThat(read(file)).isEqualTo(made);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("samples")
  void theLapTurnsOnceAndHasItsLengthAndSmallestRadius(
      String file, Circuit made, int turns, double length, double radius) throws IOException {
    Circuit circuit = read(file);
    assertThat(circuit.closed()).isTrue();
    assertThat(circuit.length()).isEqualTo(length);
    double spacing = length / circuit.stations().size();
    double turning = circuit.stations().stream().mapToDouble(Station::curvature).sum() * spacing;
    // every station's curvature is rounded to 1e-12 1/m
    assertThat(turning).isCloseTo(turns * 2 * Math.PI, within(1e-8));
    double sharpest =
        circuit.stations().stream().mapToDouble(s -> Math.abs(s.curvature())).max().orElseThrow();
    assertThat(1 / sharpest).isCloseTo(radius, within(0.01 * radius));
  }

  /** Curvature of three positions: four times the triangle's area over the product of its sides. */
  @ParameterizedTest(name = "{0}")
  @MethodSource("samples")
  void positionsAndCurvatureAgree(
      String file, Circuit made, int turns, double length, double radius) throws IOException {
    List<Station> stations = read(file).stations();
    int n = stations.size();
    for (int i = 0; i < n; i++) {
      Station a = stations.get((i + n - 1) % n);
      Station b = stations.get(i);
      Station c = stations.get((i + 1) % n);
      double area2 = (b.x() - a.x()) * (c.y() - a.y()) - (c.x() - a.x()) * (b.y() - a.y());
      double fromPositions = 2 * area2 / (apart(a, b) * apart(b, c) * apart(c, a));
      // three positions see the curvature of both neighbours with a weight of a sixth each; a
      // transition of 12 m bends it by 6 / radius / 12² 1/m³
      double bend = 6 / radius / 144 * 4 / 6;
      assertThat(fromPositions).isCloseTo(b.curvature(), within(bend));
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("samples")
  void theLapDoesNotTouchItself(String file, Circuit made, int turns, double length, double radius)
      throws IOException {
    List<Station> stations = read(file).stations();
    for (Station a : stations) {
      for (Station b : stations) {
        double along = Math.abs(a.distance() - b.distance());
        if (Math.min(along, length - along) > 60) {
          assertThat(apart(a, b)).isGreaterThan(APART);
        }
      }
    }
  }

  private static double apart(Station a, Station b) {
    return Math.hypot(a.x() - b.x(), a.y() - b.y());
  }

  private static Circuit read(String file) throws IOException {
    try (InputStream in = SampleFiles.open(file)) {
      return StationCsv.read(file, in);
    }
  }
}
