package rampwright.vehicle.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.Conditions;

class RoadTest {
  private static final Conditions CALM = Conditions.STANDARD;

  private static Conditions wind(double speed, double from) {
    return new Conditions(1, 0, 1.225, speed, from);
  }

  /** An open run along the y axis whose columns change linearly. */
  private static Circuit ramp() {
    List<Station> stations = new ArrayList<>();
    for (int i = 0; i <= 40; i++) {
      double s = 5 * i;
      stations.add(
          new Station(s, 1e-4 * s, 0, s, 2e-4 * s, -1e-4 * s, 1 - 1e-3 * s, 0.9 + 1e-4 * s));
    }
    return new Circuit("ramp", false, 200, stations);
  }

  /** Akima, <i>A new method of interpolation</i>, J. ACM 17(4), 1970: a straight line is kept. */
  @Test
  @Tag("validation")
  void columnsThatChangeLinearlyAreKeptWithTheirSlope() {
    Road road = Road.of(ramp(), CALM, 2);
    assertThat(road.size()).isEqualTo(101);
    for (int i = 0; i < road.size(); i++) {
      double s = 2 * i;
      assertThat(road.curvature(i)).isCloseTo(1e-4 * s, within(1e-14));
      assertThat(road.curvatureGradient(i)).isCloseTo(1e-4, within(1e-14));
      assertThat(road.grade(i)).isCloseTo(2e-4 * s, within(1e-14));
      // a grade that rises is a dip
      assertThat(road.verticalCurvature(i)).isCloseTo(2e-4, within(1e-14));
      assertThat(road.bank(i)).isCloseTo(-1e-4 * s, within(1e-14));
      assertThat(road.gripLeft(i)).isCloseTo(1 - 1e-3 * s, within(1e-13));
      assertThat(road.gripRight(i)).isCloseTo(0.9 + 1e-4 * s, within(1e-13));
    }
  }

  @Test
  void aLapIsTheSameRoadWhereverItStarts() {
    Circuit circuit = SampleCircuits.hilly();
    int shift = 333;
    List<Station> turned = new ArrayList<>();
    int n = circuit.stations().size();
    double spacing = circuit.length() / n;
    for (int i = 0; i < n; i++) {
      Station s = circuit.stations().get((i + shift) % n);
      turned.add(
          new Station(
              i * spacing,
              s.curvature(),
              s.x(),
              s.y(),
              s.grade(),
              s.bank(),
              s.gripLeft(),
              s.gripRight()));
    }
    Road one = Road.of(circuit, wind(5, 1), 2);
    Road other = Road.of(new Circuit("turned", true, circuit.length(), turned), wind(5, 1), 2);
    for (int i = 0; i < n; i++) {
      int k = (i + shift) % n;
      assertThat(other.curvature(i)).isCloseTo(one.curvature(k), within(1e-9));
      assertThat(other.curvatureGradient(i)).isCloseTo(one.curvatureGradient(k), within(1e-8));
      assertThat(other.verticalCurvature(i)).isCloseTo(one.verticalCurvature(k), within(1e-8));
      assertThat(other.headwind(i)).isCloseTo(one.headwind(k), within(5e-3));
    }
  }

  @Test
  void theCurvatureDoesNotOvershootAtTheEndOfAStraight() {
    List<Station> stations = new ArrayList<>();
    for (int i = 0; i <= 60; i++) {
      stations.add(Station.flat(4 * i, i < 30 ? 0 : 0.02, 4 * i, 0));
    }
    Road road = Road.of(new Circuit("step", false, 240, stations), CALM, 0.5);
    for (int i = 0; i < road.size(); i++) {
      assertThat(road.curvature(i)).isBetween(-1e-15, 0.02 + 1e-15);
    }
  }

  @Test
  void windFromAheadIsPositive() {
    // the ramp starts northwards and turns left by 2 rad
    Road ahead = Road.of(ramp(), wind(5, Math.PI / 2), 2);
    Road behind = Road.of(ramp(), wind(5, -Math.PI / 2), 2);
    assertThat(ahead.headwind(0)).isCloseTo(5, within(1e-4));
    assertThat(behind.headwind(0)).isCloseTo(-5, within(1e-4));
    // its positions are straight, which turns the start by a quarter of the first step's 0.0025 rad
    assertThat(ahead.headwind(100)).isCloseTo(5 * Math.cos(2), within(3.2e-3));
  }

  @Test
  void theWindOfAClosedLapBlowsFromAheadAsMuchAsFromBehind() {
    Road road = Road.of(SampleCircuits.fast(), wind(6, 0.7), 2);
    double sum = 0;
    for (int i = 0; i < road.size(); i++) {
      sum += road.headwind(i) * road.spacing();
    }
    // the line integral of a constant vector round a closed line is nothing
    assertThat(sum / road.length()).isCloseTo(0, within(2e-3));
  }
}
