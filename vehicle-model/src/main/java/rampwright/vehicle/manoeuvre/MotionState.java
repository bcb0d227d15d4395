package rampwright.vehicle.manoeuvre;

import java.util.List;
import rampwright.vehicle.trim.Trim;
import rampwright.vehicle.trim.WheelState;

/**
 * State of the car at one moment.
 *
 * @param vx speed along the body (m/s)
 * @param vy speed across the body (m/s)
 * @param yawRate yaw rate (rad/s)
 * @param wheelSpeeds speeds of the four wheels (rad/s)
 */
public record MotionState(double vx, double vy, double yawRate, List<Double> wheelSpeeds) {
  /** Number of values in a state as solvers see it. */
  static final int SIZE = 7;

  static final int YAW_RATE = 2;
  static final int WHEEL = 3;

  /** Copies the list. */
  public MotionState {
    wheelSpeeds = List.copyOf(wheelSpeeds);
    if (wheelSpeeds.size() != 4) {
      throw new IllegalArgumentException("four wheel speeds are needed");
    }
  }

  /** Returns the state of the car in a trim. */
  public static MotionState of(Trim trim) {
    return new MotionState(
        trim.speed() * Math.cos(trim.sideslip()),
        trim.speed() * Math.sin(trim.sideslip()),
        trim.speed() * trim.curvature(),
        trim.wheels().stream().map(WheelState::speed).toList());
  }

  static MotionState of(double[] y) {
    return new MotionState(
        y[0], y[1], y[YAW_RATE], List.of(y[WHEEL], y[WHEEL + 1], y[WHEEL + 2], y[WHEEL + 3]));
  }

  double[] toArray() {
    double[] y = new double[SIZE];
    y[0] = vx;
    y[1] = vy;
    y[YAW_RATE] = yawRate;
    for (int i = 0; i < 4; i++) {
      y[WHEEL + i] = wheelSpeeds.get(i);
    }
    return y;
  }

  /** Returns the speed (m/s). */
  public double speed() {
    return Math.hypot(vx, vy);
  }

  /** Returns the sideslip angle (rad). */
  public double sideslip() {
    return Math.atan2(vy, vx);
  }
}
