package rampwright.vehicle.lap;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.Car;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.circuit.survey.StationCsv;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.trim.Trim;
import rampwright.vehicle.trim.TrimCheck;
import rampwright.vehicle.trim.Trims;

/**
 * What holds for every lap, on the sample circuits. Optimality of the two passes: Velenis and
 * Tsiotras 2005; Lipp and Boyd, International Journal of Control 87(6), 2014.
 */
@Tag("property")
class LapInvariantTest {
  private static final double SPACING = 4;
  private static final DifferentialSet PLATE =
      DifferentialSet.rear(new PlateDifferential(60, 0.3, 0.2));
  private static final String SLOW = "circuits/kestrelwick.csv";
  private static final String FAST = "circuits/velmoor.csv";

  private static Circuit sample(String file) {
    try (InputStream in = SampleFiles.open(file)) {
      return StationCsv.read(file, in);
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }

  private static Lap lap(Car car, Conditions conditions, Circuit circuit, LimitForm form) {
    return LapSolver.solve(
        new LapRequest(car, PLATE, conditions, Driver.QUICK, form, circuit, SPACING));
  }

  private static double time(CarBuilder car, Circuit circuit) {
    return lap(car.build(), Conditions.STANDARD, circuit, LimitForm.CAR).time();
  }

  /** Every station of the trace is a trim: {@link TrimCheck} finds nothing out of balance. */
  @ParameterizedTest
  @ValueSource(strings = {SLOW, FAST})
  void everyStationBalances(String file) {
    Car car = new CarBuilder().build();
    Lap lap = lap(car, Conditions.STANDARD, sample(file), LimitForm.DRIVER);
    TrimCheck check = new TrimCheck(car, Conditions.STANDARD, PLATE);
    for (int i = 0; i < lap.road().size(); i++) {
      check.check(TraceTrims.at(lap, i));
    }
  }

  /** No station is driven faster than a search of its own finds possible. */
  @ParameterizedTest
  @EnumSource(LimitForm.class)
  void noStationIsFasterThanItsCorneringLimit(LimitForm form) {
    Car car = new CarBuilder().build();
    Lap lap = lap(car, Conditions.STANDARD, sample(SLOW), form);
    Trims trims = new Trims(car, Conditions.STANDARD, PLATE);
    double growth = form == LimitForm.CAR ? Double.POSITIVE_INFINITY : Driver.QUICK.powerGrowth();
    int compared = 0;
    for (int i = 0; i < lap.road().size(); i += 5) {
      Trim t = TraceTrims.at(lap, i);
      if (Math.abs(t.ay()) > 3) {
        double limit =
            trims
                .cornerLimit(t.curvature(), t.curvatureGradient(), growth)
                .map(found -> found.trim().speed())
                .orElse(Double.POSITIVE_INFINITY);
        assertThat(t.speed()).as("station %d", i).isLessThanOrEqualTo(limit * 1.002);
        compared++;
      }
    }
    assertThat(compared).isGreaterThan(20);
  }

  @Test
  void moreGripIsFaster() {
    double before = Double.POSITIVE_INFINITY;
    Car car = new CarBuilder().build();
    for (double grip : new double[] {0.6, 0.9, 1}) {
      Conditions wet = Conditions.STANDARD.withGrip(grip);
      double time = lap(car, wet, sample(SLOW), LimitForm.CAR).time();
      assertThat(time).as("grip %s", grip).isLessThan(before);
      before = time;
    }
  }

  @Test
  void morePowerIsFaster() {
    double before = Double.POSITIVE_INFINITY;
    for (double power : new double[] {120e3, 250e3, 300e3}) {
      CarBuilder car = new CarBuilder();
      car.engine = CarBuilder.strongestAt(power, power * 330 / 250e3, 890);
      double time = time(car, sample(FAST));
      assertThat(time).as("%s W", power).isLessThan(before);
      before = time;
    }
  }

  @Test
  void moreDragOrMoreMassIsSlower() {
    Circuit circuit = sample(FAST);
    CarBuilder draggy = new CarBuilder();
    draggy.dragArea *= 1.1;
    CarBuilder heavy = new CarBuilder();
    heavy.mass *= 1.03;
    double time = time(new CarBuilder(), circuit);
    assertThat(time(draggy, circuit)).isGreaterThan(time);
    assertThat(time(heavy, circuit)).isGreaterThan(time);
  }

  private static Circuit rotated(Circuit circuit, int by) {
    List<Station> from = circuit.stations();
    double offset = from.get(by).distance();
    List<Station> stations = new ArrayList<>();
    for (int i = 0; i < from.size(); i++) {
      Station s = from.get((i + by) % from.size());
      double distance = s.distance() - offset + (s.distance() < offset ? circuit.length() : 0);
      stations.add(Station.flat(distance, s.curvature(), s.x(), s.y()));
    }
    return new Circuit(circuit.name(), true, circuit.length(), stations);
  }

  /** Stations stay the same places (the spacing is a multiple of the file's). */
  @ParameterizedTest
  @ValueSource(strings = {SLOW, FAST})
  void theLapDoesNotDependOnWhereItStarts(String file) {
    Circuit circuit = sample(file);
    double time = time(new CarBuilder(), circuit);
    for (int by : new int[] {200, 666}) {
      assertThat(time(new CarBuilder(), rotated(circuit, by))).isCloseTo(time, within(1e-3));
    }
  }

  private static Circuit mirrored(Circuit circuit) {
    return new Circuit(
        circuit.name(),
        true,
        circuit.length(),
        circuit.stations().stream()
            .map(s -> Station.flat(s.distance(), -s.curvature(), s.x(), -s.y()))
            .toList());
  }

  @ParameterizedTest
  @ValueSource(strings = {SLOW, FAST})
  void theMirrorImageOfACircuitTakesTheSameTime(String file) {
    Circuit circuit = sample(file);
    assertThat(time(new CarBuilder(), mirrored(circuit)))
        .isCloseTo(time(new CarBuilder(), circuit), within(1e-3));
  }

  private static Circuit reversed(Circuit circuit) {
    List<Station> stations = new ArrayList<>();
    for (Station s : circuit.stations()) {
      double distance = s.distance() == 0 ? 0 : circuit.length() - s.distance();
      stations.add(Station.flat(distance, s.curvature(), s.x(), s.y()));
    }
    Collections.sort(stations, (a, b) -> Double.compare(a.distance(), b.distance()));
    return new Circuit(circuit.name(), true, circuit.length(), stations);
  }

  /** A car that drives as it brakes needs the same time either way round. */
  @Test
  void aCarThatDrivesAsItBrakesTakesTheSameTimeEitherWayRound() {
    Car car = PointMass.parts(620, 1.3, 3e6, 0, 0).build();
    Circuit circuit = sample(FAST);
    double time = PointMass.lap(car, circuit, SPACING).time();
    assertThat(PointMass.lap(car, reversed(circuit), SPACING).time())
        .isCloseTo(time, within(1e-3 * time));
  }

  /** Halving the spacing moves the lap time by less than a ten-thousandth from 4 m on. */
  @Test
  void theLapTimeSettlesAsTheSpacingIsHalved() {
    double length = 1200;
    Circuit circuit =
        PointMass.line(
            true,
            length,
            2,
            s -> {
              double turn = 2 * Math.PI / length;
              return turn * (1 + 2.2 * Math.cos(2 * turn * s) + 0.9 * Math.cos(3 * turn * s));
            });
    Car car = PointMass.parts(620, 1.5, 5e5, 0.7, 2.15).build();
    double before = PointMass.lap(car, circuit, 4).time();
    for (double spacing : new double[] {2, 1}) {
      double time = PointMass.lap(car, circuit, spacing).time();
      assertThat(time).as("%s m", spacing).isCloseTo(before, within(1e-4 * time));
      before = time;
    }
  }
}
