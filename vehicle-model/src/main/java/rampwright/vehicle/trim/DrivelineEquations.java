package rampwright.vehicle.trim;

import java.util.Objects;
import java.util.stream.Stream;
import rampwright.vehicle.Car;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.driveline.DriveLayout;

/**
 * What differentials and brakes ask of wheel torques and wheel speeds, assembled from the
 * description of the driveline: one equation per differential, and with the brakes on one for an
 * axle that is not driven. Every torque and speed in them is a fixed linear function of the results
 * of {@link ForceBalance}, so one solver serves every layout.
 *
 * <p>With the brakes off the cage torque is the sum of the driven wheels' torques. With the brakes
 * on the cage torque is an input and the total brake torque is what the wheels take beyond it.
 */
final class DrivelineEquations {
  /** Whether the brakes are on. */
  final boolean braking;

  /** Wheels that the cage or the brakes turn; the others roll free. */
  final int[] activeWheels;

  /** Differentials of the front axle, the centre and the rear axle; null where there is none. */
  final DifferentialEquation front;

  final DifferentialEquation centre;
  final DifferentialEquation rear;

  /** The differentials that exist, in the order front, centre, rear. */
  final DifferentialEquation[] differentials;

  /** Speed of the case that the engine turns, as a function of the force balance. */
  final LinearForm cageSpeedOf;

  /** Sum of the torques of the active wheels, as a function of the force balance. */
  final LinearForm totalTorqueOf;

  /** Axle that only the brakes act on: cage torque it would have, which must be zero; or null. */
  final LinearForm undrivenCageOf;

  final double undrivenCageByInput;

  private DrivelineEquations(Car car, DifferentialSet set, boolean braking) {
    this.braking = braking;
    DriveLayout layout = car.driveline().layout();
    boolean frontDriven = layout != DriveLayout.REAR;
    boolean rearDriven = layout != DriveLayout.FRONT;
    double split = !frontDriven ? 0 : rearDriven ? car.driveline().frontTorqueShare() : 1;
    double frontBrake = braking ? car.brakes().frontShare() : 0;
    double rearBrake = braking ? 1 - frontBrake : 0;

    if (braking || frontDriven && rearDriven) {
      activeWheels = new int[] {0, 1, 2, 3};
    } else {
      activeWheels = frontDriven ? new int[] {0, 1} : new int[] {2, 3};
    }
    double[] total = new double[ForceBalance.SIZE];
    for (int i : activeWheels) {
      total[ForceBalance.TORQUE + i] = 1;
    }
    totalTorqueOf = LinearForm.of(total);
    double[] cageSpeed = new double[ForceBalance.SIZE];
    for (int i = 0; i < 4; i++) {
      cageSpeed[ForceBalance.SPEED + i] = (i < 2 ? split : 1 - split) / 2;
    }
    cageSpeedOf = LinearForm.of(cageSpeed);
    double[] frontCage = axleCage(0, frontBrake);
    double[] rearCage = axleCage(2, rearBrake);
    front =
        frontDriven || braking
            ? axle(0, frontDriven ? set.front() : OpenDifferential.IDEAL, frontCage, frontBrake)
            : null;
    rear =
        rearDriven || braking
            ? axle(2, rearDriven ? set.rear() : OpenDifferential.IDEAL, rearCage, rearBrake)
            : null;
    centre =
        frontDriven && rearDriven
            ? centre(set.centre(), split, frontCage, rearCage, frontBrake, rearBrake)
            : null;
    boolean undriven = braking && centre == null;
    undrivenCageOf = undriven ? LinearForm.of(frontDriven ? rearCage : frontCage) : null;
    undrivenCageByInput = undriven ? (frontDriven ? rearBrake : frontBrake) : 0;
    differentials =
        Stream.of(front, centre, rear)
            .filter(Objects::nonNull)
            .toArray(DifferentialEquation[]::new);
  }

  static DrivelineEquations driving(Car car, DifferentialSet set) {
    return new DrivelineEquations(car, set, false);
  }

  static DrivelineEquations braking(Car car, DifferentialSet set) {
    return new DrivelineEquations(car, set, true);
  }

  /** Cage torque of an axle: its wheels' torque plus its share of the brake torque. */
  private static double[] axleCage(int left, double brakeShare) {
    double[] cage = new double[ForceBalance.SIZE];
    for (int i = 0; i < 4; i++) {
      boolean own = i == left || i == left + 1;
      cage[ForceBalance.TORQUE + i] = (own ? 1 : 0) - brakeShare;
    }
    return cage;
  }

  private static DifferentialEquation axle(
      int left, Differential law, double[] cage, double cageByInput) {
    double[] difference = new double[ForceBalance.SIZE];
    difference[ForceBalance.TORQUE + left] = -1;
    difference[ForceBalance.TORQUE + left + 1] = 1;
    double[] speed = new double[ForceBalance.SIZE];
    speed[ForceBalance.SPEED + left] = 1;
    speed[ForceBalance.SPEED + left + 1] = -1;
    return new DifferentialEquation(law, difference, 0, speed, cage, cageByInput);
  }

  /**
   * Centre unit with a nominal front share {@code q}: the friction moves {@code D/2} from one
   * output to the other, so {@code D = 2 q T_rear - 2 (1-q) T_front}.
   */
  private static DifferentialEquation centre(
      Differential law,
      double split,
      double[] frontCage,
      double[] rearCage,
      double frontBrake,
      double rearBrake) {
    double[] difference = new double[ForceBalance.SIZE];
    double[] cage = new double[ForceBalance.SIZE];
    double[] speed = new double[ForceBalance.SIZE];
    for (int j = 0; j < ForceBalance.SIZE; j++) {
      difference[j] = 2 * split * rearCage[j] - 2 * (1 - split) * frontCage[j];
      cage[j] = rearCage[j] + frontCage[j];
    }
    for (int i = 0; i < 4; i++) {
      speed[ForceBalance.SPEED + i] = i < 2 ? 0.5 : -0.5;
    }
    return new DifferentialEquation(
        law,
        difference,
        2 * split * rearBrake - 2 * (1 - split) * frontBrake,
        speed,
        cage,
        frontBrake + rearBrake);
  }
}
