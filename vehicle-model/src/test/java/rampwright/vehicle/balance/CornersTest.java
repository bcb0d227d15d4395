package rampwright.vehicle.balance;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.Stream;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Road;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.circuit.Station;

class CornersTest {
  private static final double SPACING = 2;

  private static Corners corners(Circuit circuit) {
    return Corners.of(Road.of(circuit, Conditions.STANDARD, SPACING));
  }

  @Test
  void everyCornerOfTheSegmentListIsFoundWithItsDirectionAndTurning() {
    // degrees of the segments from which the sample was drawn, left positive
    List<Integer> drawn = List.of(168, -172, 170, -84, 70, 176, -168, 118, -66, 148);
    List<Corner> found = corners(SampleCircuits.slow()).list();
    assertThat(found).hasSameSizeAs(drawn);
    for (int k = 0; k < drawn.size(); k++) {
      Corner corner = found.get(k);
      assertThat(corner.number()).isEqualTo(k + 1);
      assertThat(corner.left()).isEqualTo(drawn.get(k) > 0);
      // what turns below the threshold at both ends is left out
      assertThat(Math.toDegrees(corner.turning()))
          .isBetween(Math.abs(drawn.get(k)) - 4.0, Math.abs(drawn.get(k)) + 2.0);
    }
  }

  @Test
  void theFastSampleHasTwelve() {
    assertThat(corners(SampleCircuits.fast()).list()).hasSize(12);
  }

  @Test
  void numberAndPlaceDoNotDependOnTheSpacing() {
    Circuit circuit = SampleCircuits.slow();
    List<Corner> fine = Corners.of(Road.of(circuit, Conditions.STANDARD, 1)).list();
    List<Corner> coarse = Corners.of(Road.of(circuit, Conditions.STANDARD, 5)).list();
    assertThat(coarse).hasSameSizeAs(fine);
    for (int k = 0; k < fine.size(); k++) {
      assertThat(coarse.get(k).first() * 5.0).isCloseTo(fine.get(k).first(), Offset.offset(6.0));
    }
  }

  @Test
  void noiseBetweenTheThresholdsNeitherOpensNorCutsACorner() {
    List<Station> stations =
        Stream.iterate(0, i -> i <= 200, i -> i + 1)
            .map(i -> Station.flat(i * SPACING, noisy(i), i * SPACING, 0))
            .toList();
    List<Corner> found = corners(new Circuit("noisy", false, 200 * SPACING, stations)).list();
    assertThat(found).hasSize(1);
    assertThat(found.get(0).first()).isBetween(59, 61);
    assertThat(found.get(0).count()).isBetween(59, 61);
  }

  private static double noisy(int i) {
    double noise = i % 2 == 0 ? 0.0008 : -0.0008;
    return i >= 60 && i < 120 ? 0.0035 + noise : noise;
  }

  @Test
  void aCornerOverTheStartLineIsOneCornerAndTheLast() {
    Circuit circuit = SampleCircuits.slow();
    Corner first = corners(circuit).list().get(0);
    List<Corner> found = corners(startingAt(circuit, first.tightest())).list();
    assertThat(found).hasSize(10);
    Corner last = found.get(9);
    assertThat(last.left()).isEqualTo(first.left());
    assertThat(last.count()).isEqualTo(first.count());
    assertThat(last.first() + last.count()).isGreaterThan(circuit.stations().size());
    assertThat(last.turning()).isCloseTo(first.turning(), Offset.offset(1e-9));
  }

  private static Circuit startingAt(Circuit circuit, int start) {
    List<Station> old = circuit.stations();
    List<Station> stations =
        Stream.iterate(0, i -> i < old.size(), i -> i + 1)
            .map(i -> moved(old.get((start + i) % old.size()), old.get(i).distance()))
            .toList();
    return new Circuit(circuit.name(), true, circuit.length(), stations);
  }

  private static Station moved(Station s, double distance) {
    return Station.flat(distance, s.curvature(), s.x(), s.y());
  }

  @Test
  void aStraightRoadHasNone() {
    List<Station> stations =
        Stream.iterate(0, i -> i <= 20, i -> i + 1)
            .map(i -> Station.flat(i * 10.0, 0, i * 10.0, 0))
            .toList();
    assertThat(corners(new Circuit("runway", false, 200, stations)).list()).isEmpty();
  }
}
