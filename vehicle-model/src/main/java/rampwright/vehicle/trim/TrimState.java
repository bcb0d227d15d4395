package rampwright.vehicle.trim;

/**
 * Unknowns and results of one trim: a mutable slot that solvers fill, copy and start from. Signs
 * and units as in {@link Trim}.
 */
public final class TrimState {
  /** Whether the service brakes are on. */
  public boolean braking;

  /** Speed along the path (m/s). */
  public double speed;

  /** Sideslip angle (rad). */
  public double sideslip;

  /** Road-wheel steer angle (rad). */
  public double steer;

  /** Path acceleration (m/s²). */
  public double ax;

  /** Longitudinal slips in the order of {@link rampwright.vehicle.chassis.Wheel}. */
  public final double[] slip = new double[4];

  /** Mean slip of the active wheels: the parameter of the branch. */
  public double meanSlip;

  /** Cage torque (N·m). */
  public double cageTorque;

  /** Total brake torque (N·m). */
  public double brakeTorque;

  /** Speed of the engine-driven case (rad/s). */
  public double cageSpeed;

  /** Sign of the determinant of the equilibrium at constant mean slip. */
  int determinantSign;

  /** Largest real part of the eigenvalues of sideslip and yaw rate (1/s); NaN until asked for. */
  public double sigma;

  // tangent of the branch: derivatives with mean slip
  double sideslipRate;
  double steerRate;
  double axRate;
  final double[] slipRate = new double[4];
  double torqueRate;

  /** Copies everything. */
  public void copyFrom(TrimState other) {
    braking = other.braking;
    speed = other.speed;
    sideslip = other.sideslip;
    steer = other.steer;
    ax = other.ax;
    meanSlip = other.meanSlip;
    cageTorque = other.cageTorque;
    brakeTorque = other.brakeTorque;
    cageSpeed = other.cageSpeed;
    determinantSign = other.determinantSign;
    sigma = other.sigma;
    sideslipRate = other.sideslipRate;
    steerRate = other.steerRate;
    axRate = other.axRate;
    torqueRate = other.torqueRate;
    System.arraycopy(other.slip, 0, slip, 0, 4);
    System.arraycopy(other.slipRate, 0, slipRate, 0, 4);
  }

  /** Moves the unknowns along the tangent. */
  void predict(TrimState from, double meanSlipStep) {
    copyFrom(from);
    sideslip += sideslipRate * meanSlipStep;
    steer += steerRate * meanSlipStep;
    ax += axRate * meanSlipStep;
    for (int i = 0; i < 4; i++) {
      slip[i] += slipRate[i] * meanSlipStep;
    }
    meanSlip += meanSlipStep;
  }
}
