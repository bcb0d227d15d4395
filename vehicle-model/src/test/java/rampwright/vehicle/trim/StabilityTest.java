package rampwright.vehicle.trim;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.vehicle.Car;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.WheelLoads;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.tyre.PeakAtLoad;
import rampwright.vehicle.tyre.PeakSlipTyre;
import rampwright.vehicle.tyre.SlipCurve;
import rampwright.vehicle.tyre.Tyre;

class StabilityTest {
  private static final double CAR = Double.POSITIVE_INFINITY;

  static Stream<Arguments> laws() {
    return Stream.of(
        arguments(OpenDifferential.IDEAL, 0, 0),
        arguments(new PlateDifferential(60, 0.2, 0.1), 0.2, -0.1),
        arguments(new PlateDifferential(20, 0.6, 0.4), 0.6, -0.4),
        arguments(new Spool(), 0, 0));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("laws")
  @Tag("property")
  void theGrowthRateIsThatOfADisturbedCar(Differential law, double drive, double coast) {
    Car car = new CarBuilder().build();
    Trims trims = new Trims(car, Conditions.STANDARD, DifferentialSet.rear(law));
    double[][] points = {{12, 8}, {20, 11}, {30, 12}, {45, 10}, {40, 2}, {50, 0}};
    for (double[] p : points) {
      double kappa = p[1] / (p[0] * p[0]);
      for (double torque : new double[] {-60, 100, 400}) {
        agree(car, trims.atCageTorque(p[0], kappa, 0, torque).orElseThrow(), drive, coast);
      }
      agree(car, trims.brakeLimit(p[0], kappa, 0, 1).orElseThrow().trim(), drive, coast);
      agree(car, trims.driveLimit(p[0], kappa, 0, 0).orElseThrow().trim(), drive, coast);
    }
  }

  private static void agree(Car car, Trim trim, double drive, double coast) {
    double cage = trim.axles().get(1).cageTorque();
    double share = cage >= 0 ? drive : coast;
    double growth = GrowthByDifferences.of(car, Conditions.STANDARD, trim, share);
    assertThat(trim.sigma())
        .as("%s m/s, %s m/s², cage %s N·m", trim.speed(), trim.ay(), cage)
        .isCloseTo(growth, within(0.01 + 1e-3 * Math.abs(growth)));
  }

  /** Tyre with a wide linear range and a given stiffness (N/rad) at one load (N). */
  private static Tyre cornering(double load, double stiffness) {
    SlipCurve curve = SlipCurve.peakAtOne(1.6);
    double start = curve.shape() * curve.scale();
    double angle = Math.min(Math.toRadians(39), 4.9 * start * load / stiffness);
    double friction = stiffness * angle / (start * load);
    return new PeakSlipTyre(
        new PeakAtLoad(load / 2, friction, friction, 0.5, angle),
        new PeakAtLoad(load * 2, friction, friction, 0.5, angle),
        curve,
        curve);
  }

  /**
   * Wong, <i>Theory of Ground Vehicles</i>, example 5.1 (inputs from memory): 20.105 kN, 2.8 m,
   * 53.5 % on the front axle, 47.82 and 38.25 kN/rad per tyre: critical speed 53.10 m/s with g =
   * 9.81.
   */
  @Test
  @Tag("validation")
  void anOversteeringCarBecomesUnstableAtTheTextbooksCriticalSpeed() {
    double mass = 20_105 / 9.81;
    CarBuilder b = new CarBuilder();
    b.mass = mass;
    b.yawInertia = 3000;
    b.wheelbase = 2.8;
    b.cgToFrontAxle = (1 - 0.535) * 2.8;
    b.cgHeight = 0;
    b.rollCentreFront = 0;
    b.rollCentreRear = 0;
    b.trackFront = 0.6;
    b.trackRear = 0.6;
    b.dragArea = 0;
    b.downforceFront = 0;
    b.downforceRear = 0;
    double weight = mass * WheelLoads.GRAVITY;
    b.front = cornering(0.535 * weight / 2, 47_820);
    b.rear = cornering(0.465 * weight / 2, 38_250);
    Trims trims =
        new Trims(b.build(), Conditions.STANDARD, DifferentialSet.rear(OpenDifferential.IDEAL));
    double low = 20;
    double high = 100;
    while (high - low > 1e-6) {
      double v = (low + high) / 2;
      double sigma = trims.atCageTorque(v, 0, 0, 0).orElseThrow().sigma();
      if (sigma < 0) {
        low = v;
      } else {
        high = v;
      }
    }
    assertThat(low).isCloseTo(53.10, within(0.02));
  }

  /** Linear single-track car: eigenvalues of the textbook's two-by-two matrix, exact. */
  @Test
  @Tag("validation")
  void theGrowthRateOfALinearCarIsThatOfTheSingleTrackModel() {
    CarBuilder b = new CarBuilder();
    b.cgHeight = 0;
    b.rollCentreFront = 0;
    b.rollCentreRear = 0;
    b.dragArea = 0;
    b.downforceFront = 0;
    b.downforceRear = 0;
    double weight = b.mass * WheelLoads.GRAVITY;
    double share = (b.wheelbase - b.cgToFrontAxle) / b.wheelbase;
    b.front = cornering(share * weight / 2, 45_000);
    b.rear = cornering((1 - share) * weight / 2, 52_000);
    Trims trims =
        new Trims(b.build(), Conditions.STANDARD, DifferentialSet.rear(OpenDifferential.IDEAL));
    double cf = 90_000;
    double cr = 104_000;
    double la = b.cgToFrontAxle;
    double lb = b.wheelbase - la;
    for (double v : new double[] {8, 15, 30, 60}) {
      double a11 = -(cf + cr) / (b.mass * v);
      double a12 = (lb * cr - la * cf) / (b.mass * v * v) - 1;
      double a21 = (lb * cr - la * cf) / b.yawInertia;
      double a22 = -(la * la * cf + lb * lb * cr) / (b.yawInertia * v);
      double expected = GrowthByDifferences.largestRealPart(a11 + a22, a11 * a22 - a12 * a21);
      double sigma = trims.atCageTorque(v, 0, 0, 0).orElseThrow().sigma();
      assertThat(sigma).isCloseTo(expected, within(1e-6));
    }
    assertThat(trims.cornerLimit(0.02, 0, CAR)).isPresent();
  }
}
