package rampwright.vehicle.trim;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.WheelLoads;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Road;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.differential.BrakeLock;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.PlateFriction;
import rampwright.vehicle.differential.PreloadPath;
import rampwright.vehicle.differential.RefinedPlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.differential.TorqueSensingDifferential;
import rampwright.vehicle.differential.ViscousDifferential;
import rampwright.vehicle.driveline.DriveLayout;

/** Each kind of differential in a car: laws, limits and what every mechanic knows of them. */
class DifferentialKindsTest {
  private static final double CAR = Double.POSITIVE_INFINITY;
  private static final double RADIUS = 0.318;

  static Stream<Differential> kinds() {
    PlateDifferential plate = new PlateDifferential(60, 0.25, 0.1);
    return Stream.of(
        new OpenDifferential(0.1),
        ViscousDifferential.newtonian(10.47),
        new ViscousDifferential(150, 3, 0.5),
        new TorqueSensingDifferential(15, 2.4, 1.7),
        new BrakeLock(0.02, 9000, 700),
        new RefinedPlateDifferential(
            plate, 0.05, PreloadPath.PARALLEL, new PlateFriction(0.7, 3, 120, 80, 0.002)),
        new RefinedPlateDifferential(
            plate, 0, PreloadPath.SERIES, new PlateFriction(1.2, 3, 80, 80, 0)));
  }

  private static CarBuilder car(DriveLayout layout) {
    CarBuilder b = new CarBuilder();
    b.layout = layout;
    b.frontTorqueShare = 0.45;
    return b;
  }

  @ParameterizedTest
  @MethodSource("kinds")
  void everyKindBalancesInEveryPositionOfEveryLayout(Differential law) {
    for (DriveLayout layout : DriveLayout.values()) {
      CarBuilder b = car(layout);
      DifferentialSet set = new DifferentialSet(law, law, law);
      TrimCheck check = new TrimCheck(b.build(), Conditions.STANDARD, set);
      Trims trims = new Trims(b.build(), Conditions.STANDARD, set);
      for (double curvature : new double[] {0.012, -0.025}) {
        double speed = Math.sqrt(8 / Math.abs(curvature));
        check.check(trims.atCageTorque(speed, curvature, 0, 500).orElseThrow());
        check.check(trims.atCageTorque(speed, curvature, 0, -200).orElseThrow());
        check.check(trims.driveLimit(speed, curvature, 0, CAR).orElseThrow().trim());
        check.check(trims.brakeLimit(speed, curvature, 0, CAR).orElseThrow().trim());
      }
    }
  }

  /** Common practice, no source: a viscous unit's trims lie between the open and the locked one. */
  @ParameterizedTest
  @EnumSource(names = {"REAR", "FRONT"})
  void aViscousUnitLiesBetweenOpenAndLocked(DriveLayout layout) {
    Trim open = trim(layout, OpenDifferential.IDEAL);
    Trim locked = trim(layout, new Spool());
    double yawBefore = open.yawMomentDifferential();
    double speedBefore = difference(open, layout);
    for (double coefficient : new double[] {1e-4, 1, 30, 300, 3000, 1e5}) {
      Trim trim = trim(layout, ViscousDifferential.newtonian(coefficient));
      assertThat(trim.yawMomentDifferential()).isGreaterThan(yawBefore - 1e-6);
      assertThat(difference(trim, layout)).isLessThan(speedBefore + 1e-9);
      yawBefore = trim.yawMomentDifferential();
      speedBefore = difference(trim, layout);
    }
    assertThat(speedBefore).isLessThan(0.02 * difference(open, layout));
    assertThat(yawBefore).isCloseTo(locked.yawMomentDifferential(), within(20.0));
  }

  private static Trim trim(DriveLayout layout, Differential law) {
    DifferentialSet set = new DifferentialSet(law, OpenDifferential.IDEAL, law);
    return new Trims(car(layout).build(), Conditions.STANDARD, set)
        .atCageTorque(20, 0.015, 0, 400)
        .orElseThrow();
  }

  private static double difference(Trim trim, DriveLayout layout) {
    return trim.axles().get(layout == DriveLayout.FRONT ? 0 : 1).speedDifference();
  }

  /**
   * A car with even tyres, long and narrow so that hardly any side force is needed, its left wheels
   * on little grip.
   */
  private static Uneven uneven(Differential law, double left) {
    CarBuilder b = new CarBuilder();
    b.mass = 400;
    b.wheelbase = 8;
    b.cgToFrontAxle = 4;
    b.cgHeight = 0;
    b.trackFront = 0.5;
    b.trackRear = 0.5;
    b.dragArea = 0;
    b.downforceFront = 0;
    b.downforceRear = 0;
    b.engine = CarBuilder.strongestAt(5e6, 5000, 1000);
    b.front = CarBuilder.even(1, 0.1, 1.6);
    b.rear = b.front;
    List<Station> stations = new ArrayList<>();
    for (int i = 0; i < 6; i++) {
      stations.add(new Station(10 * i, 0, 10 * i, 0, 0, 0, left, 1));
    }
    Road road = Road.of(new Circuit("split", false, 50, stations), Conditions.STANDARD, 10);
    TrimSolver solver = new TrimSolver(b.build(), Conditions.STANDARD, DifferentialSet.rear(law));
    solver.place(road, 2);
    TrimState level = new TrimState();
    TrimState limit = new TrimState();
    assertThat(solver.constantSpeed(10, level)).isTrue();
    solver.driveLimit(level, 1, CAR, limit);
    assertThat(solver.restore(limit)).isTrue();
    return new Uneven(limit, solver.results().toTrim(), limit.ax * 400);
  }

  private record Uneven(TrimState state, Trim trim, double force) {}

  private static final double LOAD = 400 * WheelLoads.GRAVITY / 4;

  /**
   * Common practice, no source: with one wheel on (next to) no grip an open unit moves next to
   * nothing and neither does a torque-sensing one without preload; a locked one moves the car.
   */
  @Test
  void withOneWheelOnNoGripOnlyALockMovesTheCar() {
    double low = 0.05 * LOAD;
    assertThat(uneven(OpenDifferential.IDEAL, 0.05).force()).isCloseTo(2 * low, within(1.0));
    assertThat(uneven(new TorqueSensingDifferential(0, 3, 3), 0.05).force())
        .isCloseTo(4 * low, within(1.5));
    assertThat(uneven(new Spool(), 0.05).force()).isCloseTo(low + LOAD, within(8.0));
  }

  /** Common practice, no source: locking one half shaft to the case locks both. */
  @Test
  void lockingOneHalfShaftToTheCaseLocksBoth() {
    Uneven locked = uneven(new Spool(), 0.3);
    double cage = locked.state().cageSpeed;
    assertThat(locked.trim().wheels().get(2).speed()).isCloseTo(cage, within(1e-9));
    assertThat(locked.trim().wheels().get(3).speed()).isCloseTo(cage, within(1e-9));
    Uneven open = uneven(OpenDifferential.IDEAL, 0.3);
    double left = open.trim().wheels().get(2).speed() - open.state().cageSpeed;
    double right = open.trim().wheels().get(3).speed() - open.state().cageSpeed;
    assertThat(left).isGreaterThan(0.1).isCloseTo(-right, within(1e-9));
  }

  /**
   * The brake of the spinning wheel raises the other wheel's torque by its own torque, the driven
   * force is {@code (2 T_low + T_b)/r}, and the engine pays for both; our derivation, exact but for
   * the little side force that holds the car straight.
   */
  @Test
  void aBrakeLockMovesTheCarAtTheEnginesExpense() {
    double low = 0.3 * LOAD;
    Uneven braked = uneven(new BrakeLock(0.02, 20000, 100), 0.3);
    assertThat(braked.trim().axles().get(1).wheelBrakeTorque()).isEqualTo(100);
    assertThat(braked.force()).isCloseTo(2 * low + 100 / RADIUS, within(4.0));
    assertThat(braked.trim().cageTorque()).isCloseTo(braked.force() * RADIUS + 100, within(2.0));
    double supplied = braked.trim().cageTorque() * braked.state().cageSpeed;
    double atTyres = 0;
    for (WheelState wheel : braked.trim().wheels().subList(2, 4)) {
      atTyres += wheel.fx() * RADIUS * wheel.speed();
    }
    assertThat(supplied - atTyres)
        .isCloseTo(100 * braked.trim().wheels().get(2).speed(), within(1e-6 * supplied));
  }
}
