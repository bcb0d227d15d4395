package rampwright.vehicle.trim;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.WheelLoads;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.tyre.PeakAtLoad;
import rampwright.vehicle.tyre.PeakSlipTyre;
import rampwright.vehicle.tyre.SlipCurve;
import rampwright.vehicle.tyre.Tyre;

/** Yaw moment of a locked axle and the steering that it costs, in the range of linear tyres. */
@Tag("validation")
class LockedAxleValidationTest {
  private static final SlipCurve CURVE = SlipCurve.peakAtOne(1.6);

  /** Tyre with given stiffnesses (N per unit slip, N/rad) at one load (N). */
  private static Tyre stiff(double load, double slipStiffness, double cornering) {
    double start = CURVE.shape() * CURVE.scale();
    // the widest linear range that a valid tyre has
    double angle = Math.min(Math.toRadians(39), 4.9 * start * load / cornering);
    double frictionY = cornering * angle / (start * load);
    double frictionX = slipStiffness * 0.6 / (start * load);
    PeakAtLoad light = new PeakAtLoad(load / 2, frictionX, frictionY, 0.6, angle);
    PeakAtLoad heavy = new PeakAtLoad(load * 2, frictionX, frictionY, 0.6, angle);
    return new PeakSlipTyre(light, heavy, CURVE, CURVE);
  }

  /**
   * Flat car: no load transfer, no air. Axle stiffnesses in N/rad, rear slip stiffness per wheel.
   */
  private static CarBuilder car(
      double mass, double front, double rear, double slipStiffness, double track) {
    CarBuilder b = new CarBuilder();
    b.mass = mass;
    b.wheelbase = 2.6;
    b.cgToFrontAxle = 1.25;
    b.cgHeight = 0;
    b.rollCentreFront = 0;
    b.rollCentreRear = 0;
    b.trackFront = track;
    b.trackRear = track;
    b.dragArea = 0;
    b.downforceFront = 0;
    b.downforceRear = 0;
    double weight = mass * WheelLoads.GRAVITY;
    b.front = stiff(weight * 1.35 / 2.6 / 2, slipStiffness, front / 2);
    b.rear = stiff(weight * 1.25 / 2.6 / 2, slipStiffness, rear / 2);
    return b;
  }

  private static Trim coasting(CarBuilder b, Differential law, double speed, double radius) {
    return new Trims(b.build(), Conditions.STANDARD, DifferentialSet.rear(law))
        .atCageTorque(speed, 1 / radius, 0, 0)
        .orElseThrow();
  }

  /**
   * Both wheels at one speed on a circle differ in slip by t/R; with linear tyres the moment is
   * {@code C t²/(2R)} against the turn: C 120 kN, t 1.5 m, R 100 m give 1350 N·m.
   */
  @Test
  void aLockedAxleTurnsTheCarOutOfTheCornerByItsSlipStiffness() {
    CarBuilder b = car(4000, 400_000, 400_000, 120_000, 1.5);
    Trim trim = coasting(b, new Spool(), 3, 100);
    assertThat(trim.yawMomentDifferential()).isCloseTo(1350, within(3.0));
    double inside = trim.wheels().get(2).slip();
    double outside = trim.wheels().get(3).slip();
    assertThat(inside - outside).isCloseTo(1.5 / 100, within(2e-4));
  }

  /**
   * Steady cornering of the linear single-track car with an outside yaw moment (positive into the
   * turn): {@code delta = L/R + K ay - Mz (Cf + Cr)/(L Cf Cr)}; m 1300 kg, a 1.25 m, b 1.35 m, Cf
   * 90, Cr 110 kN/rad, R 100 m, 20 m/s give 1.9064 deg without moment and 2.1290 deg with -500 N·m.
   * The tolerance covers the angles' cubes and the tyres' bend.
   */
  @Test
  void theSteeringThatALockedAxleCostsIsThatOfTheSingleTrackCar() {
    double slipStiffness = 44_444;
    CarBuilder b = car(1300, 90_000, 110_000, slipStiffness, 1.5);
    b.trackFront = 1.5;
    Trim open = coasting(b, OpenDifferential.IDEAL, 20, 100);
    Trim locked = coasting(b, new Spool(), 20, 100);
    assertThat(Math.toDegrees(open.steer())).isCloseTo(1.9064, within(0.012));
    assertThat(locked.yawMomentDifferential()).isCloseTo(500, within(5.0));
    assertThat(Math.toDegrees(locked.steer())).isCloseTo(2.1290, within(0.014));
    assertThat(Math.toDegrees(locked.steer() - open.steer())).isCloseTo(0.2226, within(0.004));
  }
}
