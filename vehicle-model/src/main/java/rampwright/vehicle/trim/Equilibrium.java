package rampwright.vehicle.trim;

import java.util.Arrays;
import rampwright.vehicle.driveline.Driveline;

/**
 * The equations of a trim and their solution by Newton's method. Unknowns: sideslip, steer, path
 * acceleration (or speed, when the acceleration is given) and the slips of the active wheels.
 * Equations: longitudinal and lateral force, yaw moment
 *
 * <pre>
 *   sum Mz = Izz r_dot,   r = v kappa,   r_dot = v² kappa' + kappa ax
 * </pre>
 *
 * the law of each differential, brake balance, and one closing condition. The Jacobian is exact. A
 * workspace, one instance per thread and per driveline equations.
 */
final class Equilibrium {
  /** What closes the equations. */
  enum Closing {
    /** Mean slip of the active wheels has a given value. */
    MEAN_SLIP,
    /** Torque of all active wheels together has a given value. */
    TOTAL_TORQUE,
    /** Path acceleration has a given value. */
    ACCELERATION,
    /** Cage torque is the engine's full-load torque in a given gear. */
    FULL_LOAD,
    /** Distance along the tangent, with speed as the third unknown at zero path acceleration. */
    ARC
  }

  private static final int MOST_ITERATIONS = 16;

  /**
   * Scaled residual from which one more linear correction is exact to working precision: Newton's
   * error is quadratic, so what is left is of the order of the square.
   */
  private static final double CLOSE = 1e-7;

  /** The same where the correction may change sticking into sliding, whose slopes differ. */
  private static final double CLOSE_AT_EDGE = 1e-11;

  /** Angles (rad) and slips (-) up to which a correction may be the last. */
  private static final double SMALL_CORRECTION = 1e-4;

  /** Scaled residual beyond which no iteration is tried. */
  private static final double HOPELESS = 1e6;

  /** Longitudinal stiffness over load below which a wheel counts as past its peak. */
  private static final double SPENT = 3;

  private static final double LARGEST_ANGLE_STEP = 0.12;
  private static final double LARGEST_SLIP_STEP = 0.08;

  final ForceBalance forces;
  final DrivelineEquations driveline;
  private final Driveline engineSide;
  private final SmallSystem system = new SmallSystem(7, 2);
  private final double[] torqueColumn = new double[7];
  private final double[] cageSpeedColumn = new double[7];
  private final int size;
  private final double[] rightSide = new double[7];

  // workspace of one evaluation
  private double cosBeta;
  private double sinBeta;
  private double fx;
  private double fy;
  private double speedScale;
  private double torqueScale;

  // closing condition
  private Closing closing;
  private double target;
  private int gear;

  /** Cage torque with the brakes on (N·m). */
  double input;

  /** Line for {@link Closing#ARC}. */
  private Arc arc;

  Equilibrium(ForceBalance forces, DrivelineEquations driveline, Driveline engineSide) {
    this.forces = forces;
    this.driveline = driveline;
    this.engineSide = engineSide;
    this.size = 3 + driveline.activeWheels.length;
  }

  int size() {
    return size;
  }

  boolean atMeanSlip(TrimState state, double meanSlip) {
    return solve(state, Closing.MEAN_SLIP, meanSlip, 0);
  }

  boolean atTotalTorque(TrimState state, double torque) {
    return solve(state, Closing.TOTAL_TORQUE, torque, 0);
  }

  boolean atAcceleration(TrimState state, double ax) {
    return solve(state, Closing.ACCELERATION, ax, 0);
  }

  boolean atFullLoad(TrimState state, int inGear) {
    return solve(state, Closing.FULL_LOAD, 0, inGear);
  }

  /** Solves at a distance along a line; leaves the tangent there in the line. */
  boolean alongArc(TrimState state, Arc line, double distance) {
    arc = line;
    return solve(state, Closing.ARC, distance, 0);
  }

  /**
   * Solves from the state given, which is overwritten.
   *
   * @return false when Newton's method does not converge; the state is then of no use
   */
  private boolean solve(TrimState state, Closing how, double value, int inGear) {
    closing = how;
    target = value;
    gear = inGear;
    for (int iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
      evaluate(state);
      double worst = residuals(state);
      if (!(worst < HOPELESS)) {
        return false;
      }
      assemble(state);
      boolean last = worst < (atEdge() ? CLOSE_AT_EDGE : CLOSE);
      if (!system.solve(size, last ? 2 : 1)) {
        return false;
      }
      if (last && correctionIsSmall()) {
        finish(state);
        return true;
      }
      step(state);
    }
    return false;
  }

  /** Whether the correction is small enough for its square not to matter, even near a fold. */
  private boolean correctionIsSmall() {
    double largest = Math.max(Math.abs(solution(0)), Math.abs(solution(1)));
    for (int j = 3; j < size; j++) {
      largest = Math.max(largest, Math.abs(solution(j)));
    }
    return largest < SMALL_CORRECTION;
  }

  private boolean atEdge() {
    for (DifferentialEquation differential : driveline.differentials) {
      if (differential.atEdge) {
        return true;
      }
    }
    return false;
  }

  private void evaluate(TrimState state) {
    double v = state.speed;
    cosBeta = Math.cos(state.sideslip);
    sinBeta = Math.sin(state.sideslip);
    double tangential = forces.tangential(v, state.ax);
    double normal = forces.normal(v);
    fx = tangential * cosBeta - normal * sinBeta;
    fy = tangential * sinBeta + normal * cosBeta;
    forces.evaluate(v, sinBeta, cosBeta, forces.curvature, state.steer, fx, fy, state.slip);
    double radius = forces.radius(driveline.activeWheels[driveline.activeWheels.length - 1]);
    speedScale = 0.05 * v / radius;
    torqueScale = forces.weight * radius;
    for (DifferentialEquation differential : driveline.differentials) {
      differential.evaluate(forces.value, input, speedScale, torqueScale);
    }
  }

  /** Computes the right-hand side; returns the largest scaled residual. */
  private double residuals(TrimState state) {
    double v = state.speed;
    double yawAcceleration = v * v * forces.curvatureGradient + forces.curvature * state.ax;
    double perForce = 1 / forces.weight;
    double perMoment = perForce / forces.wheelbase;
    rightSide[0] = -(forces.value[ForceBalance.X] - forces.mass * fx) * perForce;
    rightSide[1] = -(forces.value[ForceBalance.Y] - forces.mass * fy) * perForce;
    rightSide[2] =
        -(forces.value[ForceBalance.M] - forces.yawInertia * yawAcceleration) * perMoment;
    int row = 3;
    for (DifferentialEquation differential : driveline.differentials) {
      rightSide[row++] = -differential.residual;
    }
    if (driveline.undrivenCageOf != null) {
      rightSide[row++] =
          -(driveline.undrivenCageOf.apply(forces.value) + driveline.undrivenCageByInput * input)
              / torqueScale;
    }
    if (row < size) {
      rightSide[row] = -closingResidual(state);
    }
    double worst = 0;
    for (int i = 0; i < size; i++) {
      double miss = Math.abs(rightSide[i]);
      if (!(miss <= worst)) {
        worst = miss;
      }
    }
    return worst;
  }

  /** Fills the matrix and both right-hand sides. */
  private void assemble(TrimState state) {
    double v = state.speed;
    column(0, 1, 0, -fy, fx, 0, 0);
    column(1, 0, 1, 0, 0, 0, 0);
    if (speedIsUnknown()) {
      double dTangential = forces.tangentialBySpeed(v);
      double dNormal = forces.normalBySpeed(v);
      column(
          2,
          0,
          0,
          dTangential * cosBeta - dNormal * sinBeta,
          dTangential * sinBeta + dNormal * cosBeta,
          1,
          2 * v * forces.curvatureGradient);
    } else {
      column(2, 0, 0, cosBeta, sinBeta, 0, forces.curvature);
    }
    for (int j = 0; j < driveline.activeWheels.length; j++) {
      forces.slipDirection(driveline.activeWheels[j]);
      storeColumn(3 + j, 0, 0, 0);
    }
    for (int i = 0; i < size; i++) {
      system.a[system.rightHandSide(i, 0)] = rightSide[i];
      system.a[system.rightHandSide(i, 1)] = i == size - 1 ? 1 : 0;
    }
  }

  private void column(
      int j,
      double dBeta,
      double dDelta,
      double dFx,
      double dFy,
      double dSpeed,
      double dYawAcceleration) {
    forces.direction(dBeta, 0, dDelta, dFx, dFy, dSpeed);
    storeColumn(j, dFx, dFy, dYawAcceleration);
  }

  private void storeColumn(int j, double dFx, double dFy, double dYawAcceleration) {
    double[] a = system.a;
    double[] change = forces.change;
    double perForce = 1 / forces.weight;
    a[system.at(0, j)] = (change[ForceBalance.X] - forces.mass * dFx) * perForce;
    a[system.at(1, j)] = (change[ForceBalance.Y] - forces.mass * dFy) * perForce;
    a[system.at(2, j)] =
        (change[ForceBalance.M] - forces.yawInertia * dYawAcceleration)
            * perForce
            / forces.wheelbase;
    int row = 3;
    for (DifferentialEquation differential : driveline.differentials) {
      a[system.at(row++, j)] = differential.change(change, speedScale, torqueScale);
    }
    if (driveline.undrivenCageOf != null) {
      a[system.at(row++, j)] = driveline.undrivenCageOf.apply(change) / torqueScale;
    }
    torqueColumn[j] = driveline.totalTorqueOf.apply(change);
    cageSpeedColumn[j] = driveline.cageSpeedOf.apply(change);
    a[system.at(row, j)] = closingChange(j);
  }

  private double closingResidual(TrimState state) {
    return switch (closing) {
      case MEAN_SLIP -> meanSlip(state) - target;
      case TOTAL_TORQUE -> (driveline.totalTorqueOf.apply(forces.value) - target) / torqueScale;
      case ACCELERATION -> (state.ax - target) / 10;
      case FULL_LOAD -> {
        double cageSpeed = driveline.cageSpeedOf.apply(forces.value);
        double torque = driveline.totalTorqueOf.apply(forces.value);
        yield (torque - engineSide.fullTorque(gear, cageSpeed)) / torqueScale;
      }
      case ARC -> arc.distance(state) - target;
    };
  }

  private double closingChange(int j) {
    return switch (closing) {
      case MEAN_SLIP -> j < 3 ? 0 : 1.0 / driveline.activeWheels.length;
      case TOTAL_TORQUE -> torqueColumn[j] / torqueScale;
      case ACCELERATION -> j == 2 ? 0.1 : 0;
      case FULL_LOAD -> {
        double cageSpeed = driveline.cageSpeedOf.apply(forces.value);
        double slope = engineSide.fullTorqueSlope(gear, cageSpeed);
        yield (torqueColumn[j] - slope * cageSpeedColumn[j]) / torqueScale;
      }
      case ARC -> arc.direction[j] / arc.scale(j);
    };
  }

  private boolean speedIsUnknown() {
    return closing == Closing.ARC && arc.inSpeed;
  }

  /**
   * Evaluates a solved state once more, so that forces and torques belong to it. Unlike solving at
   * its mean slip this does not move a state at which the branch turns back in mean slip.
   *
   * @return false when it is no trim at the point where the force balance stands
   */
  boolean holds(TrimState state) {
    closing = Closing.MEAN_SLIP;
    target = meanSlip(state);
    evaluate(state);
    if (!(residuals(state) < CLOSE)) {
      return false;
    }
    state.meanSlip = target;
    storeTorques(
        state,
        driveline.totalTorqueOf.apply(forces.value),
        driveline.cageSpeedOf.apply(forces.value));
    return true;
  }

  private void storeTorques(TrimState state, double torque, double cageSpeed) {
    state.braking = driveline.braking;
    state.cageTorque = driveline.braking ? input : torque;
    state.brakeTorque = driveline.braking ? input - torque : 0;
    state.cageSpeed = cageSpeed;
    state.sigma = Double.NaN;
  }

  /**
   * Solves a solved state once more at constant mean slip; returns whether its determinant has the
   * sign given.
   */
  boolean signAtMeanSlipIs(int sign, TrimState state) {
    double sigma = state.sigma;
    boolean solved = atMeanSlip(state, meanSlip(state));
    state.sigma = sigma;
    return solved && state.determinantSign == sign;
  }

  /** Whether a wheel of those that the engine or the brakes turn gains next to nothing by slip. */
  boolean someWheelSpent() {
    for (int i : driveline.activeWheels) {
      if (forces.tyre[i].fxSlip < SPENT * forces.loads.load(i)) {
        return true;
      }
    }
    return false;
  }

  /** Returns the slip at the peak of an active wheel's tyre at a quarter of the car's weight. */
  double peakSlip() {
    return forces.tyreModel(driveline.activeWheels[0]).slipAtPeak(forces.weight / 4);
  }

  private double meanSlip(TrimState state) {
    double sum = 0;
    for (int i : driveline.activeWheels) {
      sum += state.slip[i];
    }
    return sum / driveline.activeWheels.length;
  }

  private double solution(int j) {
    return system.a[system.rightHandSide(j, 0)];
  }

  private double tangent(int j) {
    return system.a[system.rightHandSide(j, 1)];
  }

  private void step(TrimState state) {
    double shrink = Math.max(Math.abs(solution(0)), Math.abs(solution(1))) / LARGEST_ANGLE_STEP;
    for (int j = 3; j < size; j++) {
      shrink = Math.max(shrink, Math.abs(solution(j)) / LARGEST_SLIP_STEP);
    }
    if (speedIsUnknown()) {
      shrink = Math.max(shrink, Math.abs(solution(2)) / (0.2 * state.speed));
    }
    double factor = shrink > 1 ? 1 / shrink : 1;
    state.sideslip += factor * solution(0);
    state.steer += factor * solution(1);
    if (speedIsUnknown()) {
      state.speed += factor * solution(2);
    } else {
      state.ax += factor * solution(2);
    }
    for (int j = 3; j < size; j++) {
      state.slip[driveline.activeWheels[j - 3]] += factor * solution(j);
    }
  }

  /**
   * Applies the last correction, to the results as well, and stores the tangent of the branch: the
   * second solution is the change of the unknowns with the closing condition, and the change of the
   * mean slip along it relates the two determinants by Cramer's rule.
   */
  private void finish(TrimState state) {
    double torque = driveline.totalTorqueOf.apply(forces.value);
    double cageSpeed = driveline.cageSpeedOf.apply(forces.value);
    double meanSlipRate = 0;
    double torqueRate = 0;
    for (int j = 0; j < size; j++) {
      torque += torqueColumn[j] * solution(j);
      cageSpeed += cageSpeedColumn[j] * solution(j);
      torqueRate += torqueColumn[j] * tangent(j);
      meanSlipRate += j < 3 ? 0 : tangent(j) / driveline.activeWheels.length;
    }
    step(state);
    state.meanSlip = meanSlip(state);
    storeTorques(state, torque, cageSpeed);
    if (closing == Closing.ARC) {
      for (int j = 0; j < size; j++) {
        rightSide[j] = tangent(j);
      }
      arc.storeTangent(rightSide);
      if (arc.inSpeed) {
        return;
      }
    }
    state.determinantSign = system.determinantSign * (int) Math.signum(meanSlipRate);
    state.sideslipRate = tangent(0) / meanSlipRate;
    state.steerRate = tangent(1) / meanSlipRate;
    state.axRate = tangent(2) / meanSlipRate;
    Arrays.fill(state.slipRate, 0);
    for (int j = 3; j < size; j++) {
      state.slipRate[driveline.activeWheels[j - 3]] = tangent(j) / meanSlipRate;
    }
    state.torqueRate = (driveline.braking ? -torqueRate : torqueRate) / meanSlipRate;
  }
}
