package rampwright.vehicle.trim;

import java.util.Optional;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.input.Quantity;

/**
 * Single trims of one car with one set of differentials on a flat road, for whoever asks a question
 * about one point. Not thread-safe; make one per thread.
 *
 * <p>A growth limit is the largest growth rate of a slide that the driver masters (1/s); infinite
 * for the car's own limit.
 */
public final class Trims {
  public static final Quantity SPEED = Quantity.si("speed_mps", "speed", "m/s", 0.5, 150, "");
  public static final Quantity CURVATURE =
      Quantity.si("curvature_1pm", "curvature", "1/m", -0.5, 0.5, "it is a radius: use 1 over it");
  public static final Quantity CURVATURE_GRADIENT =
      Quantity.si("curvature_gradient_1pm2", "curvature gradient", "1/m²", -0.1, 0.1, "");

  /** Speed (m/s) above which no cornering limit is looked for. */
  private static final double HIGHEST_SPEED = 150;

  /** First lateral acceleration (m/s²) of the search for the cornering limit. */
  private static final double GENTLE = 1.5;

  /**
   * A trim at a limit.
   *
   * @param trim the trim
   * @param reason why the limit lies there
   */
  public record AtLimit(Trim trim, TrimLimit reason) {}

  private final TrimSolver solver;
  private final Driveline driveline;
  private final TrimState level = new TrimState();
  private final TrimState found = new TrimState();

  /** Prepares the equations. */
  public Trims(Car car, Conditions conditions, DifferentialSet differentials) {
    this.solver = new TrimSolver(car, conditions, differentials);
    this.driveline = car.driveline();
  }

  /**
   * Returns the trim at constant speed, or empty when there is none on the branch joined to
   * straight running.
   */
  public Optional<Trim> constantSpeed(double speed, double curvature, double curvatureGradient) {
    if (!stand(speed, curvature, curvatureGradient)) {
      return Optional.empty();
    }
    found.copyFrom(level);
    return snapshot();
  }

  /**
   * Returns the trim with a cage torque (N·m) and the brakes off, or empty when there is none on
   * the branch joined to straight running.
   */
  public Optional<Trim> atCageTorque(
      double speed, double curvature, double curvatureGradient, double torque) {
    if (!stand(speed, curvature, curvatureGradient)) {
      return Optional.empty();
    }
    return solver.reachCageTorque(level, torque, found) ? snapshot() : Optional.empty();
  }

  /** Returns the trim with the largest acceleration in the best gear. */
  public Optional<AtLimit> driveLimit(
      double speed, double curvature, double curvatureGradient, double growthMax) {
    if (!stand(speed, curvature, curvatureGradient)) {
      return Optional.empty();
    }
    int gear = driveline.bestGear(solver.rollingCageSpeed(speed));
    TrimLimit reason = solver.driveLimit(level, gear, growthMax, found);
    return snapshot().map(trim -> new AtLimit(trim, reason));
  }

  /** Returns the trim with the strongest braking. */
  public Optional<AtLimit> brakeLimit(
      double speed, double curvature, double curvatureGradient, double growthMax) {
    if (!stand(speed, curvature, curvatureGradient)) {
      return Optional.empty();
    }
    int gear = driveline.bestGear(solver.rollingCageSpeed(speed));
    TrimLimit reason = solver.brakeLimit(level, gear, growthMax, found);
    return snapshot().map(trim -> new AtLimit(trim, reason));
  }

  /**
   * Returns the trim at the largest constant speed, or empty when the path can be held at every
   * speed.
   */
  public Optional<AtLimit> cornerLimit(
      double curvature, double curvatureGradient, double growthMax) {
    CURVATURE.check(curvature);
    CURVATURE_GRADIENT.check(curvatureGradient);
    if (curvature == 0) {
      return Optional.empty();
    }
    solver.place(curvature, curvatureGradient);
    double from = Math.sqrt(GENTLE / Math.abs(curvature));
    if (!solver.cornerLimit(null, from, HIGHEST_SPEED, growthMax, found)
        || found.speed >= HIGHEST_SPEED) {
      return Optional.empty();
    }
    TrimLimit reason = found.sigma > growthMax - 1e-2 ? TrimLimit.DRIVER : TrimLimit.TYRES;
    return snapshot().map(trim -> new AtLimit(trim, reason));
  }

  private boolean stand(double speed, double curvature, double curvatureGradient) {
    SPEED.check(speed);
    CURVATURE.check(curvature);
    CURVATURE_GRADIENT.check(curvatureGradient);
    solver.place(curvature, curvatureGradient);
    return solver.constantSpeed(speed, level);
  }

  private Optional<Trim> snapshot() {
    if (!solver.restore(found)) {
      throw new IllegalStateException("a solved trim did not solve again");
    }
    return Optional.of(solver.results().toTrim());
  }
}
