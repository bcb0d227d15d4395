package rampwright.vehicle.trim;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.WheelLoads;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Road;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.driveline.DriveLayout;

/** Drive limits against handbook examples and closed forms. */
@Tag("validation")
class TractionValidationTest {
  private static final double CAR = Double.POSITIVE_INFINITY;
  private static final double OPEN_ROAD_SPEED = 10;

  private static CarBuilder car(
      double mass, double wheelbase, double cgToFront, double height, double friction) {
    CarBuilder b = new CarBuilder();
    b.mass = mass;
    b.wheelbase = wheelbase;
    b.cgToFrontAxle = cgToFront;
    b.cgHeight = height;
    b.dragArea = 0;
    b.downforceFront = 0;
    b.downforceRear = 0;
    b.engine = CarBuilder.strongestAt(5e6, 5000, 1000);
    b.front = CarBuilder.even(friction, 0.1, 1.6);
    b.rear = b.front;
    return b;
  }

  private static double straightLimit(CarBuilder b, DriveLayout layout, DifferentialSet set) {
    b.layout = layout;
    Trims.AtLimit limit =
        new Trims(b.build(), Conditions.STANDARD, set)
            .driveLimit(OPEN_ROAD_SPEED, 0, 0, CAR)
            .orElseThrow();
    assertThat(limit.reason()).isEqualTo(TrimLimit.TYRES);
    return limit.trim().ax();
  }

  private static DifferentialSet everywhere(Differential law) {
    return new DifferentialSet(law, law, law);
  }

  /**
   * Load transfer alone: {@code mu lf/(L - mu h)} and {@code mu lr/(L + mu h)} times g, all four
   * wheels {@code mu g}. Inputs: teaching slides of Waluyo 2023; an encyclopaedia article on the
   * automobile, example 31.7; Jazar, <i>Vehicle Dynamics</i>, p. 92, exercise 10. The results were
   * computed apart from this project with g = 9.81.
   */
  @ParameterizedTest(name = "{0} kg")
  @CsvSource({
    "1800, 2.6, 1.3, 0.7, 0.7, 4.2309, 2.8890, 6.867",
    "1500, 2.75, 1.15, 0.85, 0.6, 3.0218, 2.8888, 5.886",
    "1550, 2.62, 1.31, 0.72, 0.8, 5.0298, 3.2168, 7.848"
  })
  void loadTransferAloneDecidesTheDriveLimitOfACarWithEvenTyres(
      double mass,
      double wheelbase,
      double cgToFront,
      double height,
      double friction,
      double rearDriven,
      double frontDriven,
      double allDriven) {
    CarBuilder b = car(mass, wheelbase, cgToFront, height, friction);
    double gravity = WheelLoads.GRAVITY / 9.81;
    DifferentialSet open = everywhere(OpenDifferential.IDEAL);
    DifferentialSet locked = everywhere(new Spool());
    assertThat(straightLimit(b, DriveLayout.REAR, open))
        .isCloseTo(rearDriven * gravity, within(1e-4));
    assertThat(straightLimit(b, DriveLayout.REAR, locked))
        .isCloseTo(rearDriven * gravity, within(1e-4));
    assertThat(straightLimit(b, DriveLayout.FRONT, open))
        .isCloseTo(frontDriven * gravity, within(1e-4));
    assertThat(straightLimit(b, DriveLayout.ALL, locked))
        .isCloseTo(allDriven * gravity, within(1e-3));
  }

  /**
   * The same article, 31.10.3(ii): an open centre differential that splits evenly leaves twice what
   * the lighter axle can take, {@code a = 2 mu min(Ff, Fr)/m}.
   */
  @Test
  void anOpenCentreDifferentialIsLimitedByTheLighterAxle() {
    CarBuilder b = car(1500, 2.75, 1.15, 0.85, 0.6);
    double ax = straightLimit(b, DriveLayout.ALL, everywhere(OpenDifferential.IDEAL));
    double frontStatic = WheelLoads.GRAVITY * (2.75 - 1.15) / 2.75;
    double front = frontStatic - ax * 0.85 / 2.75;
    double rear = WheelLoads.GRAVITY - front;
    assertThat(ax).isCloseTo(2 * 0.6 * Math.min(front, rear), within(1e-3));
  }

  /**
   * Gillespie, <i>Fundamentals of Vehicle Dynamics</i>, 1992, ch. 2, example problem 3 and the
   * companion problem with front drive (inputs from memory): 1304.2 lb and 0.3302 g with the axle
   * locked. Our car has no reaction of the propshaft torque on the axle, which there takes load off
   * one wheel; so only the locked case can be compared, and our open axle must reach the same.
   */
  @Test
  void theLockedSolidAxleReachesTheTextbooksTraction() {
    double pound = 0.45359237;
    double inch = 0.0254;
    CarBuilder rear = car(3950 * pound, 108 * inch, 108 * inch * 1850 / 3950, 21 * inch, 0.62);
    assertThat(straightLimit(rear, DriveLayout.REAR, everywhere(new Spool())))
        .isCloseTo(0.3302 * WheelLoads.GRAVITY, within(5e-4));
    assertThat(straightLimit(rear, DriveLayout.REAR, everywhere(OpenDifferential.IDEAL)))
        .isCloseTo(0.3302 * WheelLoads.GRAVITY, within(5e-4));
    CarBuilder front = car(3100 * pound, 105 * inch, 105 * inch * 1150 / 3100, 19 * inch, 0.62);
    assertThat(straightLimit(front, DriveLayout.FRONT, everywhere(OpenDifferential.IDEAL)))
        .isCloseTo(0.3507 * WheelLoads.GRAVITY, within(5e-4));
  }

  /**
   * Uneven grip left and right, exact but for the little side force that holds the car straight
   * (long wheelbase, narrow track): open 2 F_low; with a torque bias ratio F_low (1 + TBR); preload
   * 2 F_low + D/r; locked F_low + F_high. With F_low = 1000 N and TBR 2.333 the second is 3333 N.
   */
  @Test
  void onUnevenGripTheLockDecidesHowMuchOfTheBetterSideIsUsed() {
    CarBuilder b = car(400, 8, 4, 0, 1);
    b.trackFront = 0.5;
    b.trackRear = 0.5;
    double load = 400 * WheelLoads.GRAVITY / 4;
    double low = 300;
    double high = 900;
    double locking = (2.333 - 1) / (2.333 + 1);
    assertThat(unevenForce(b, low / load, high / load, OpenDifferential.IDEAL))
        .isCloseTo(2 * low, within(2.0));
    assertThat(unevenForce(b, low / load, high / load, new PlateDifferential(0, locking, locking)))
        .isCloseTo(low * (1 + 2.333), within(4.0));
    assertThat(unevenForce(b, low / load, high / load, new PlateDifferential(60, 0, 0)))
        .isCloseTo(2 * low + 60 / b.rearRadius, within(3.0));
    assertThat(unevenForce(b, low / load, high / load, new Spool()))
        .isCloseTo(low + high, within(6.0));
  }

  private static double unevenForce(CarBuilder b, double left, double right, Differential law) {
    List<Station> stations = new ArrayList<>();
    for (int i = 0; i < 6; i++) {
      stations.add(new Station(10 * i, 0, 10 * i, 0, 0, 0, left, right));
    }
    Road road = Road.of(new Circuit("split", false, 50, stations), Conditions.STANDARD, 10);
    TrimSolver solver = new TrimSolver(b.build(), Conditions.STANDARD, DifferentialSet.rear(law));
    solver.place(road, 2);
    TrimState level = new TrimState();
    TrimState limit = new TrimState();
    assertThat(solver.constantSpeed(OPEN_ROAD_SPEED, level)).isTrue();
    solver.driveLimit(level, 1, CAR, limit);
    return limit.ax * b.mass;
  }
}
