package rampwright.vehicle.trim;

import java.util.Arrays;
import rampwright.vehicle.differential.BrakeLock;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.driveline.DriveLayout;

/**
 * Brake torques with which differentials hold back the wheel that slips more. They add to what the
 * driveline must bring to a wheel beyond the torque that its tyre takes, so that nothing else in
 * the equations knows of them. A centre unit brakes both wheels of the axle that slips more, half
 * of its torque each.
 *
 * <p>A workspace, one instance per thread: {@link #update}, then {@link #torque} and {@link
 * #bySlip}.
 */
final class WheelBrakes {
  private final Differential front;
  private final Differential centre;
  private final Differential rear;

  /** Whether any unit brakes wheels at all. */
  final boolean exist;

  private final double[] ofPosition = new double[3];
  private final double[] torque = new double[4];
  private final double[] bySlip = new double[16];

  WheelBrakes(DriveLayout layout, DifferentialSet set) {
    boolean all = layout == DriveLayout.ALL;
    front = layout == DriveLayout.REAR ? OpenDifferential.IDEAL : set.front();
    centre = all ? set.centre() : OpenDifferential.IDEAL;
    rear = layout == DriveLayout.FRONT ? OpenDifferential.IDEAL : set.rear();
    exist = front instanceof BrakeLock || centre instanceof BrakeLock || rear instanceof BrakeLock;
  }

  /** Computes the torques for the slips of the four wheels. */
  void update(double[] slip) {
    if (!exist) {
      return;
    }
    Arrays.fill(torque, 0);
    Arrays.fill(bySlip, 0);
    ofPosition[0] = axle(front, 0, slip);
    ofPosition[2] = axle(rear, 2, slip);
    double frontMean = (slip[0] + slip[1]) / 2;
    double rearMean = (slip[2] + slip[3]) / 2;
    if (frontMean > rearMean) {
      ofPosition[1] = axles(0, 2, frontMean, rearMean);
    } else {
      ofPosition[1] = axles(2, 0, rearMean, frontMean);
    }
  }

  private double axle(Differential law, int left, double[] slip) {
    int more = slip[left] > slip[left + 1] ? left : left + 1;
    int less = 2 * left + 1 - more;
    double brake = law.wheelBrakeTorque(slip[more], slip[less]);
    torque[more] += brake;
    bySlip[4 * more + more] += law.wheelBrakeBySlip(slip[more], slip[less]);
    bySlip[4 * more + less] += law.wheelBrakeByOtherSlip(slip[more], slip[less]);
    return brake;
  }

  private double axles(int more, int less, double moreSlip, double lessSlip) {
    double half = centre.wheelBrakeTorque(moreSlip, lessSlip) / 2;
    double byMore = centre.wheelBrakeBySlip(moreSlip, lessSlip) / 4;
    double byLess = centre.wheelBrakeByOtherSlip(moreSlip, lessSlip) / 4;
    for (int i = more; i < more + 2; i++) {
      torque[i] += half;
      for (int side = 0; side < 2; side++) {
        bySlip[4 * i + more + side] += byMore;
        bySlip[4 * i + less + side] += byLess;
      }
    }
    return 2 * half;
  }

  /** Returns the brake torque of a position's unit (N·m): 0 front, 1 centre, 2 rear. */
  double ofPosition(int position) {
    return ofPosition[position];
  }

  /** Returns the brake torque of a wheel (N·m). */
  double torque(int wheel) {
    return torque[wheel];
  }

  /** Returns the derivative of a wheel's brake torque with the slip of a wheel (N·m). */
  double bySlip(int wheel, int ofWheel) {
    return bySlip[4 * wheel + ofWheel];
  }
}
