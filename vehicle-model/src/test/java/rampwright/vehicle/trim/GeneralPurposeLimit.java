package rampwright.vehicle.trim;

import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresBuilder;
import org.apache.commons.math3.fitting.leastsquares.LevenbergMarquardtOptimizer;
import org.apache.commons.math3.fitting.leastsquares.MultivariateJacobianFunction;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.util.Pair;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;

/**
 * The drive limit of a rear-wheel-drive car with an open differential, found the way a
 * general-purpose library offers: the trim at a mean slip by Levenberg and Marquardt's method with
 * differences for derivatives, the largest acceleration over the mean slip by Brent's.
 */
public final class GeneralPurposeLimit {
  private static final int UNKNOWNS = 5;
  private static final double DIFFERENCE = 1e-7;
  private static final double STEP = 0.005;
  private static final int BENDS = 10;

  private final PlanarCar planar;
  private final double speed;
  private double curvature;
  private double[] last;

  /** Stands at a point of a flat road of constant curvature (1/m) at a speed (m/s). */
  public GeneralPurposeLimit(Car car, Conditions conditions, double speed, double curvature) {
    this.planar = new PlanarCar(car, conditions);
    this.speed = speed;
    this.curvature = curvature;
  }

  /**
   * Returns the largest acceleration (m/s²): steps up in mean slip until it falls, each from the
   * trim before, and then between the last three.
   */
  public double largestAcceleration() {
    last = new double[UNKNOWNS];
    bend();
    double before = Double.NEGATIVE_INFINITY;
    double meanSlip = 0;
    double now = accelerationAt(meanSlip);
    while (now > before) {
      before = now;
      meanSlip += STEP;
      now = accelerationAt(meanSlip);
    }
    UnivariateFunction acceleration = this::accelerationAt;
    return new BrentOptimizer(1e-9, 1e-11)
        .optimize(
            new MaxEval(200),
            new UnivariateObjectiveFunction(acceleration),
            GoalType.MAXIMIZE,
            new SearchInterval(Math.max(0, meanSlip - 2 * STEP), meanSlip))
        .getValue();
  }

  /** Finds the trim at no slip by bending the path in steps. */
  private void bend() {
    double wanted = curvature;
    for (int k = 1; k <= BENDS; k++) {
      curvature = wanted * k / BENDS;
      accelerationAt(0);
    }
    curvature = wanted;
  }

  private double accelerationAt(double meanSlip) {
    MultivariateJacobianFunction model =
        point -> {
          double[] unknown = point.toArray();
          return new Pair<>(
              new ArrayRealVector(misses(unknown, meanSlip)), differences(unknown, meanSlip));
        };
    last =
        new LevenbergMarquardtOptimizer()
            .withCostRelativeTolerance(1e-14)
            .withParameterRelativeTolerance(1e-12)
            .optimize(
                new LeastSquaresBuilder()
                    .start(last)
                    .target(new double[UNKNOWNS])
                    .model(model)
                    .maxEvaluations(500)
                    .maxIterations(500)
                    .build())
            .getPoint()
            .toArray();
    return last[2] * 10;
  }

  private RealMatrix differences(double[] unknown, double meanSlip) {
    RealMatrix jacobian = new Array2DRowRealMatrix(UNKNOWNS, UNKNOWNS);
    for (int j = 0; j < UNKNOWNS; j++) {
      double[] up = unknown.clone();
      double[] down = unknown.clone();
      up[j] += DIFFERENCE;
      down[j] -= DIFFERENCE;
      double[] above = misses(up, meanSlip);
      double[] below = misses(down, meanSlip);
      for (int i = 0; i < UNKNOWNS; i++) {
        jacobian.setEntry(i, j, (above[i] - below[i]) / (2 * DIFFERENCE));
      }
    }
    return jacobian;
  }

  /** Unknowns: sideslip, steer, acceleration over ten, slips of the rear wheels. */
  private double[] misses(double[] unknown, double meanSlip) {
    double ax = 10 * unknown[2];
    double along = ax + planar.drag(speed) / planar.mass;
    double across = speed * speed * curvature;
    double c = Math.cos(unknown[0]);
    double s = Math.sin(unknown[0]);
    double bodyX = along * c - across * s;
    double bodyY = along * s + across * c;
    PlanarCar.Motion m =
        planar.at(
            speed,
            unknown[0],
            speed * curvature,
            unknown[1],
            bodyX,
            bodyY,
            new double[] {0, 0, unknown[3], unknown[4]});
    return new double[] {
      (m.forceX / planar.mass - bodyX) / 10,
      (m.forceY / planar.mass - bodyY) / 10,
      (m.yawMoment - planar.inertia * curvature * ax) / (planar.mass * 10),
      (m.torque[2] - m.torque[3]) / 1000,
      (unknown[3] + unknown[4]) / 2 - meanSlip
    };
  }
}
