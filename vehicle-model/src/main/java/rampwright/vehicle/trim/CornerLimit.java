package rampwright.vehicle.trim;

/**
 * Largest speed at which the car can hold the path at constant speed. The branch of constant-speed
 * trims is followed upward in speed by its arc length, because speed itself folds at the limit.
 *
 * <p>A workspace, one instance per thread.
 */
final class CornerLimit {
  private static final double ANGLE_SCALE = 0.03;
  private static final double SPEED_SCALE = 0.06;
  private static final double SLIP_SCALE = 0.02;
  private static final double SMALLEST_STEP = 1e-4;
  private static final int MOST_STEPS = 200;

  private final Equilibrium drive;
  private final Stability stability;
  private final BranchStart start;
  private final TrimState last = new TrimState();
  private final TrimState next = new TrimState();
  private final double[] direction = new double[7];

  private double growthMax;

  CornerLimit(Equilibrium drive, Stability stability, BranchStart start) {
    this.drive = drive;
    this.stability = stability;
    this.start = start;
  }

  /**
   * Finds the limit at the point where the force balance stands.
   *
   * @param from a speed (m/s) below the limit to start from
   * @param topSpeed speed (m/s) above which the limit is of no interest
   * @param largestGrowth largest growth rate that the driver masters (1/s), infinite for the car's
   * @param out receives the trim at the limit; at {@code topSpeed} when the limit lies above it
   * @return false when there is no constant-speed trim at the first speed
   */
  boolean find(double from, double topSpeed, double largestGrowth, TrimState out) {
    if (!start.coasting(from, out) || !start.constantSpeed(out, last)) {
      return false;
    }
    return climb(topSpeed, largestGrowth, out);
  }

  /**
   * Finds the limit from a nearby trim at constant speed below it.
   *
   * @return false when the start does not converge or is no steady state for the driver
   */
  boolean findFrom(
      TrimState near, double speed, double topSpeed, double largestGrowth, TrimState out) {
    last.copyFrom(near);
    last.speed = speed;
    last.ax = 0;
    if (!drive.atAcceleration(last, 0) || last.determinantSign != start.referenceSign) {
      return false;
    }
    return climb(topSpeed, largestGrowth, out);
  }

  private boolean climb(double topSpeed, double largestGrowth, TrimState out) {
    growthMax = largestGrowth;
    // solved again so that the stability is that of the start
    if (!drive.atAcceleration(last, 0) || grows(last)) {
      return false;
    }
    if (!firstDirection()) {
      out.copyFrom(last);
      return true;
    }
    double step = 0.5;
    int steps = 0;
    while (step > SMALLEST_STEP && last.speed < topSpeed) {
      if (++steps > MOST_STEPS) {
        return false;
      }
      if (!advance(step)) {
        step /= 2;
        continue;
      }
      boolean over = drive.arcDirection[2] <= 0;
      if (over || next.determinantSign != start.referenceSign || grows(next)) {
        step /= over ? 3 : 2;
        restoreDirection();
        continue;
      }
      last.copyFrom(next);
      System.arraycopy(drive.arcDirection, 0, direction, 0, drive.size());
      step = Math.min(0.7, step * 1.5);
    }
    out.copyFrom(last);
    return true;
  }

  private boolean grows(TrimState state) {
    stability.evaluate(drive.forces, drive.driveline, state.speed, state.sideslip);
    state.sigma = stability.sigma;
    return state.sigma > growthMax;
  }

  private void restoreDirection() {
    System.arraycopy(direction, 0, drive.arcDirection, 0, drive.size());
  }

  /** Direction of the branch at the start, from a second trim at a slightly higher speed. */
  private boolean firstDirection() {
    int size = drive.size();
    for (int j = 0; j < size; j++) {
      drive.arcScale[j] = j < 2 ? ANGLE_SCALE : j == 2 ? SPEED_SCALE * last.speed : SLIP_SCALE;
    }
    next.copyFrom(last);
    next.speed = last.speed * (1 + 1e-4);
    if (!drive.atAcceleration(next, 0)) {
      return false;
    }
    double norm = 0;
    for (int j = 0; j < size; j++) {
      direction[j] = (drive.arcUnknown(next, j) - drive.arcUnknown(last, j)) / drive.arcScale[j];
      norm += direction[j] * direction[j];
    }
    norm = Math.sqrt(norm);
    for (int j = 0; j < size; j++) {
      direction[j] /= norm;
    }
    restoreDirection();
    return true;
  }

  private boolean advance(double step) {
    next.copyFrom(last);
    for (int j = 0; j < drive.size(); j++) {
      drive.arcOrigin[j] = drive.arcUnknown(last, j);
      drive.arcAdd(next, j, step * drive.arcScale[j] * drive.arcDirection[j]);
    }
    boolean solved = drive.alongArc(next, step) && drive.signAtMeanSlip(next);
    if (!solved) {
      restoreDirection();
    }
    return solved;
  }
}
