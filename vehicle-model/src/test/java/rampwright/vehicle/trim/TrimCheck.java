package rampwright.vehicle.trim;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.WheelLoads;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.driveline.DriveLayout;

/**
 * Demands of a trim on a flat road everything that makes it one, from its record alone: forces, yaw
 * moment, wheel torques, loads, kinematics and the law of every differential.
 */
public final class TrimCheck {
  /** Tolerance of the balances as a share of weight and of weight times wheelbase. */
  private static final double TOLERANCE = 2e-6;

  /**
   * Tolerance of what a trim tells about its wheels, as a share of weight and of weight times
   * radius: near a limit it may be one Newton correction older than the unknowns.
   */
  private static final double TOLD = 5e-5;

  private final PlanarCar planar;
  private final DifferentialSet set;
  private final double weight;

  /** Prepares the check of one car with its differentials. */
  public TrimCheck(Car car, Conditions conditions, DifferentialSet set) {
    this.planar = new PlanarCar(car, conditions);
    this.set = set;
    this.weight = planar.mass * WheelLoads.GRAVITY;
  }

  /** Fails unless the trim balances. */
  public void check(Trim t) {
    checkMotion(t);
    checkTorques(t);
  }

  private void checkMotion(Trim t) {
    double[] slips = new double[4];
    for (int i = 0; i < 4; i++) {
      slips[i] = t.wheels().get(i).slip();
    }
    double along = t.ax() + planar.drag(t.speed()) / planar.mass;
    double across = t.speed() * t.speed() * t.curvature();
    double c = Math.cos(t.sideslip());
    double s = Math.sin(t.sideslip());
    // the path's tangent is (c, s) in the body, its normal (-s, c)
    double specificX = along * c - across * s;
    double specificY = along * s + across * c;
    PlanarCar.Motion m =
        planar.at(
            t.speed(),
            t.sideslip(),
            t.speed() * t.curvature(),
            t.steer(),
            specificX,
            specificY,
            slips);
    for (int i = 0; i < 4; i++) {
      WheelState w = t.wheels().get(i);
      assertThat(w.fz()).as("fz %d", i).isCloseTo(m.load[i], within(TOLD * weight));
      assertThat(w.fx()).as("fx %d", i).isCloseTo(m.fx[i], within(TOLD * weight));
      assertThat(w.fy()).as("fy %d", i).isCloseTo(m.fy[i], within(TOLD * weight));
      assertThat(w.slipAngle()).as("angle %d", i).isCloseTo(m.slipAngle[i], within(2e-5));
      assertThat(w.speed()).as("speed %d", i).isCloseTo(m.wheelSpeed[i], within(2e-3));
    }
    assertThat(m.forceX).as("force").isCloseTo(planar.mass * specificX, within(TOLERANCE * weight));
    assertThat(m.forceY).as("side").isCloseTo(planar.mass * specificY, within(TOLERANCE * weight));
    double yawAcceleration = t.speed() * t.speed() * t.curvatureGradient() + t.curvature() * t.ax();
    assertThat(m.yawMoment)
        .as("yaw moment")
        .isCloseTo(
            planar.inertia * yawAcceleration,
            within(TOLERANCE * weight * planar.car.chassis().wheelbase()));
  }

  private void checkTorques(Trim t) {
    double share = planar.car.brakes().frontShare();
    double frontBrake = share * t.brakeTorque() / 2;
    double rearBrake = (1 - share) * t.brakeTorque() / 2;
    double[] driven = new double[4];
    double scale = TOLD * weight * planar.radius(2);
    for (int i = 0; i < 4; i++) {
      WheelState w = t.wheels().get(i);
      driven[i] = w.fx() * planar.radius(i) + (i < 2 ? frontBrake : rearBrake);
    }
    addWheelBrakes(driven, t);
    DriveLayout layout = planar.car.driveline().layout();
    axle(driven, t, 0, layout != DriveLayout.REAR ? set.front() : null, scale);
    axle(driven, t, 2, layout != DriveLayout.FRONT ? set.rear() : null, scale);
    double cage = driven[0] + driven[1] + driven[2] + driven[3];
    assertThat(t.cageTorque()).as("cage torque").isCloseTo(cage, within(scale));
    if (layout == DriveLayout.ALL) {
      double q = planar.car.driveline().frontTorqueShare();
      double front = driven[0] + driven[1];
      double rear = driven[2] + driven[3];
      double difference = 2 * q * rear - 2 * (1 - q) * front;
      double speed = (speed(t, 0) + speed(t, 1) - speed(t, 2) - speed(t, 3)) / 2;
      law(set.centre(), cage, difference, speed, scale, t.centre());
    }
  }

  /** What a unit takes from the wheel (axle) that slips more, the driveline must bring as well. */
  private void addWheelBrakes(double[] driven, Trim t) {
    DriveLayout layout = planar.car.driveline().layout();
    double[] s = t.wheels().stream().mapToDouble(WheelState::slip).toArray();
    if (layout != DriveLayout.REAR) {
      double brake = set.front().wheelBrakeTorque(Math.max(s[0], s[1]), Math.min(s[0], s[1]));
      driven[s[0] > s[1] ? 0 : 1] += brake;
      assertThat(t.axles().get(0).wheelBrakeTorque()).isCloseTo(brake, within(1e-6));
    }
    if (layout != DriveLayout.FRONT) {
      double brake = set.rear().wheelBrakeTorque(Math.max(s[2], s[3]), Math.min(s[2], s[3]));
      driven[s[2] > s[3] ? 2 : 3] += brake;
      assertThat(t.axles().get(1).wheelBrakeTorque()).isCloseTo(brake, within(1e-6));
    }
    if (layout == DriveLayout.ALL) {
      double front = (s[0] + s[1]) / 2;
      double rear = (s[2] + s[3]) / 2;
      double brake = set.centre().wheelBrakeTorque(Math.max(front, rear), Math.min(front, rear));
      int axle = front > rear ? 0 : 2;
      driven[axle] += brake / 2;
      driven[axle + 1] += brake / 2;
      assertThat(t.centre().wheelBrakeTorque()).isCloseTo(brake, within(1e-6));
    }
  }

  private static double speed(Trim t, int wheel) {
    return t.wheels().get(wheel).speed();
  }

  private void axle(double[] driven, Trim t, int left, Differential law, double scale) {
    if (law == null) {
      assertThat(driven[left]).as("free wheel").isCloseTo(0, within(scale));
      assertThat(driven[left + 1]).as("free wheel").isCloseTo(0, within(scale));
      return;
    }
    double cage = driven[left] + driven[left + 1];
    double difference = driven[left + 1] - driven[left];
    law(law, cage, difference, speed(t, left) - speed(t, left + 1), scale, t.axles().get(left / 2));
  }

  /** Sticks with equal speeds below its capacity, or slides at it from the faster to the slower. */
  private static void law(
      Differential law,
      double cage,
      double difference,
      double speedDifference,
      double scale,
      DifferentialState told) {
    double capacity = law.capacity(cage);
    double friction = difference - law.viscousTorque(speedDifference);
    if (told.sticking()) {
      assertThat(speedDifference).as("sticking").isCloseTo(0, within(2e-3));
      assertThat(Math.abs(friction)).as("within capacity").isLessThanOrEqualTo(capacity + scale);
    } else {
      assertThat(friction)
          .as("sliding at capacity")
          .isCloseTo(
              Math.signum(speedDifference) * capacity * law.slidingFactor(speedDifference),
              within(scale));
    }
    assertThat(told.torqueDifference()).isCloseTo(Math.abs(difference), within(scale));
    assertThat(told.speedDifference()).isCloseTo(Math.abs(speedDifference), within(2e-3));
    assertThat(told.cageTorque()).isCloseTo(cage, within(scale));
    assertThat(difference * speedDifference).as("heat").isGreaterThanOrEqualTo(-1e-6 * scale);
    assertThat(told.slidingPower()).isGreaterThanOrEqualTo(0);
  }
}
