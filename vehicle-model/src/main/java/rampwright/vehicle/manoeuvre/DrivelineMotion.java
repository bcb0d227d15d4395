package rampwright.vehicle.manoeuvre;

import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;
import rampwright.vehicle.Car;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.driveline.DriveLayout;

/**
 * From cage and brake torques to the accelerations of the four wheels. The centre unit is resolved
 * first, from the sums of both axles, then each axle with its share; that is exact because both
 * wheels of an axle have the same inertia. A workspace.
 */
final class DrivelineMotion {
  /** Speed difference (rad/s) from which a unit begins to slide. */
  private static final double APART = 1e-9;

  /** Units of the driven positions, centre first. */
  final List<FrictionUnit> units;

  final double[] acceleration = new double[4];

  private final FrictionUnit front;
  private final FrictionUnit centre;
  private final FrictionUnit rear;
  private final double split;
  private final double frontBrake;
  private final RotatingParts parts;
  private final double[] resisting = new double[4];

  DrivelineMotion(Car car, DifferentialSet set, RotatingParts parts) {
    DriveLayout layout = car.driveline().layout();
    boolean all = layout == DriveLayout.ALL;
    this.front = layout == DriveLayout.REAR ? null : new FrictionUnit(set.front());
    this.centre = all ? new FrictionUnit(set.centre()) : null;
    this.rear = layout == DriveLayout.FRONT ? null : new FrictionUnit(set.rear());
    this.split = all ? car.driveline().frontTorqueShare() : front == null ? 0 : 1;
    this.frontBrake = car.brakes().frontShare();
    this.parts = parts;
    this.units = Stream.of(centre, front, rear).filter(Objects::nonNull).toList();
  }

  /** Returns the speed of the case that the engine turns (rad/s). */
  double cageSpeed(double[] y) {
    double frontMean = (y[MotionState.WHEEL] + y[MotionState.WHEEL + 1]) / 2;
    double rearMean = (y[MotionState.WHEEL + 2] + y[MotionState.WHEEL + 3]) / 2;
    return split * frontMean + (1 - split) * rearMean;
  }

  /** Computes the acceleration of each wheel (rad/s²). */
  void update(double[] y, RoadForces road, double cageTorque, double brakeTorque) {
    for (int i = 0; i < 4; i++) {
      double share = i < 2 ? frontBrake : 1 - frontBrake;
      resisting[i] = road.fx[i] * road.radius(i) + share * brakeTorque / 2;
    }
    brakeAxle(front, 0, road.slip);
    brakeAxle(rear, 2, road.slip);
    double frontCage = split * cageTorque;
    double rearCage = (1 - split) * cageTorque;
    if (centre != null) {
      brakeCentre(road.slip);
      double frontSum = resisting[0] + resisting[1];
      double rearSum = resisting[2] + resisting[3];
      double perFront = 1 / (2 * parts.frontWheel());
      double perRear = 1 / (2 * parts.rearWheel());
      double required =
          2
              * ((frontCage - frontSum) * perFront - (rearCage - rearSum) * perRear)
              / (perFront + perRear);
      double difference =
          (y[MotionState.WHEEL] + y[MotionState.WHEEL + 1]) / 2
              - (y[MotionState.WHEEL + 2] + y[MotionState.WHEEL + 3]) / 2;
      centre.update(cageTorque, difference, required);
      frontCage -= centre.difference / 2;
      rearCage += centre.difference / 2;
    }
    axle(front, 0, y, frontCage, parts.frontWheel());
    axle(rear, 2, y, rearCage, parts.rearWheel());
  }

  private void axle(FrictionUnit unit, int left, double[] y, double cage, double inertia) {
    double difference = 0;
    if (unit != null) {
      double required = resisting[left + 1] - resisting[left];
      unit.update(cage, y[MotionState.WHEEL + left] - y[MotionState.WHEEL + left + 1], required);
      difference = unit.difference;
    }
    acceleration[left] = ((cage - difference) / 2 - resisting[left]) / inertia;
    acceleration[left + 1] = ((cage + difference) / 2 - resisting[left + 1]) / inertia;
  }

  private void brakeAxle(FrictionUnit unit, int left, double[] slip) {
    if (unit != null) {
      int more = slip[left] > slip[left + 1] ? left : left + 1;
      resisting[more] += unit.law.wheelBrakeTorque(slip[more], slip[2 * left + 1 - more]);
    }
  }

  private void brakeCentre(double[] slip) {
    double frontMean = (slip[0] + slip[1]) / 2;
    double rearMean = (slip[2] + slip[3]) / 2;
    int axle = frontMean > rearMean ? 0 : 2;
    double brake =
        centre.law.wheelBrakeTorque(Math.max(frontMean, rearMean), Math.min(frontMean, rearMean));
    resisting[axle] += brake / 2;
    resisting[axle + 1] += brake / 2;
  }

  /**
   * Sets the output speeds of a unit that begins to slide apart by next to nothing, so that the
   * event that ends the sliding does not lie at its very beginning.
   */
  void part(FrictionUnit unit, double[] y) {
    double half = unit.direction() * APART / 2;
    for (int i = 0; i < 4; i++) {
      boolean own = unit == centre || i < 2 == (unit == front);
      boolean first = unit == centre ? i < 2 : i % 2 == 0;
      if (own) {
        y[MotionState.WHEEL + i] += first ? half : -half;
      }
    }
  }

  /** Makes the output speeds of a unit exactly equal. */
  void join(FrictionUnit unit, double[] y) {
    if (unit == centre) {
      double frontMean = (y[MotionState.WHEEL] + y[MotionState.WHEEL + 1]) / 2;
      double rearMean = (y[MotionState.WHEEL + 2] + y[MotionState.WHEEL + 3]) / 2;
      double weight = parts.frontWheel() / (parts.frontWheel() + parts.rearWheel());
      double mean = weight * frontMean + (1 - weight) * rearMean;
      for (int i = 0; i < 4; i++) {
        y[MotionState.WHEEL + i] += mean - (i < 2 ? frontMean : rearMean);
      }
      return;
    }
    int left = MotionState.WHEEL + (unit == front ? 0 : 2);
    double mean = (y[left] + y[left + 1]) / 2;
    y[left] = mean;
    y[left + 1] = mean;
  }
}
