package rampwright.vehicle.differential;

import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * Plate-type unit with the terms that {@link PlateDifferential} leaves out:
 *
 * <pre>
 *   parallel   D_cap = f (P + (k + k_gear) |T|)
 *   series     D_cap = f max(P, (k + k_gear) |T|)
 * </pre>
 *
 * with {@code f} the temperature factor of friction, and the sliding factor while it slides.
 *
 * @param nominal preload and shares from ramps, at breakaway and reference temperature
 * @param sideGearShare {@code k_gear}: locking share that side-gear thrust adds (-)
 * @param preloadPath whether springs and ramps clamp together
 * @param friction how friction changes
 */
public record RefinedPlateDifferential(
    PlateDifferential nominal,
    double sideGearShare,
    PreloadPath preloadPath,
    PlateFriction friction)
    implements Differential {
  public static final Quantity SIDE_GEAR_SHARE =
      Quantity.si("side_gear_share", "locking share of side-gear thrust", "", 0, 5, "");

  /** Checks the share and that nothing is missing. */
  public RefinedPlateDifferential {
    SIDE_GEAR_SHARE.check(sideGearShare);
    if (preloadPath == null) {
      throw InvalidInput.of("preload path", "missing", "parallel or series", "");
    }
  }

  /** Returns whether any term differs from the plain law's. */
  public boolean refines() {
    return sideGearShare != 0
        || preloadPath != PreloadPath.PARALLEL
        || !friction.equals(PlateFriction.CONSTANT);
  }

  private double share(double cageTorque) {
    double ramp = cageTorque >= 0 ? nominal.driveShare() : nominal.coastShare();
    return ramp + sideGearShare;
  }

  @Override
  public double capacity(double cageTorque) {
    double clamped = share(cageTorque) * Math.abs(cageTorque);
    double sum =
        preloadPath == PreloadPath.PARALLEL
            ? nominal.preload() + clamped
            : Math.max(nominal.preload(), clamped);
    return friction.temperatureFactor() * sum;
  }

  @Override
  public double capacitySlope(double cageTorque) {
    double share = share(cageTorque);
    boolean springsOnly =
        preloadPath == PreloadPath.SERIES && share * Math.abs(cageTorque) < nominal.preload();
    double slope = cageTorque >= 0 ? share : -share;
    return springsOnly ? 0 : friction.temperatureFactor() * slope;
  }

  @Override
  public double slidingFactor(double speedDifference) {
    return friction.slidingFactor(speedDifference);
  }

  @Override
  public double slidingFactorSlope(double speedDifference) {
    return friction.slidingFactorSlope(speedDifference);
  }
}
