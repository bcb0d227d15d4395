package rampwright.optimiser.sheet;

import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.PlateDifferential;

/**
 * What a torque wrench must show before the unit goes into the car.
 *
 * <p>With one wheel held, the other turned and the propshaft free, no torque reaches the case: the
 * ramps are unloaded and the reading is half the preload. With the propshaft locked and the other
 * wheel free the reading is the whole torque difference, but its reaction goes through the ramps
 * and clamps the plates further. With the law {@code D = P + k T} and {@code T = D}
 *
 * <pre>
 *   reading = P / (1 - k)      k of the coast flanks when the wheel is turned forwards,
 *                              of the drive flanks when it is turned backwards
 * </pre>
 *
 * and the unit does not break away at all from {@code k = 1} on. Source: statics of the unit, our
 * derivation from the law of {@link PlateDifferential}.
 *
 * <p>The band is what plate friction scatters, ±15 % (common practice, no source), or half a shim
 * step where that is more.
 *
 * @param wheelHeld one wheel held, the other turned, propshaft free
 * @param springsAlone whole torque difference of the springs, the preload of the law
 * @param lockedForwards propshaft locked, one wheel free, the other turned forwards
 * @param lockedBackwards the same, turned backwards
 */
public record BenchCheck(
    Target wheelHeld, Target springsAlone, Target lockedForwards, Target lockedBackwards) {
  /** Scatter of plate friction (-): common practice, no source. */
  public static final double FRICTION_SCATTER = 0.15;

  /**
   * A reading with the band in which it may lie.
   *
   * @param value expected (N·m); infinite when the unit does not break away
   * @param low lower end (N·m)
   * @param high upper end (N·m); infinite when the unit may not break away
   */
  public record Target(double value, double low, double high) {
    /** Returns whether the unit is expected to break away at all. */
    public boolean breaksAway() {
      return Double.isFinite(value);
    }
  }

  /**
   * Returns the check of a build.
   *
   * @param build the unit
   * @param shimStep change of preload by one shim step (N·m)
   */
  public static BenchCheck of(PlateBuild build, double shimStep) {
    double half = Math.max(FRICTION_SCATTER * build.preload(), shimStep / 2);
    PlateDifferential middle = build.law();
    PlateDifferential weak = scattered(middle, -half, 1 - FRICTION_SCATTER);
    PlateDifferential strong = scattered(middle, half, 1 + FRICTION_SCATTER);
    Function<ToDoubleFunction<PlateDifferential>, Target> target =
        way ->
            new Target(
                way.applyAsDouble(middle), way.applyAsDouble(weak), way.applyAsDouble(strong));
    return new BenchCheck(
        target.apply(PlateDifferential::breakawayWheelHeld),
        target.apply(PlateDifferential::preload),
        target.apply(law -> law.breakawayPropshaftLocked(true)),
        target.apply(law -> law.breakawayPropshaftLocked(false)));
  }

  private static PlateDifferential scattered(PlateDifferential law, double more, double factor) {
    return new PlateDifferential(
        Math.max(0, law.preload() + more), factor * law.driveShare(), factor * law.coastShare());
  }
}
