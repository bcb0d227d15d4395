package rampwright.vehicle;

import rampwright.vehicle.input.Quantity;

/**
 * How fast a slide may grow before the driver must back off: the largest real part of the
 * sideslip-and-yaw eigenvalues (1/s) that the driver still masters.
 *
 * <p>There is no published figure; the defaults are ours. A slide while braking in a straight line
 * is corrected easily, so the allowance for braking rises linearly to {@link
 * #STRAIGHT_LINE_BRAKING} as the lateral acceleration falls from {@link #BRAKING_FADE} to zero.
 *
 * @param powerGrowth largest growth rate on power and in steady cornering (1/s)
 * @param brakingGrowth largest growth rate when braking in a turn (1/s)
 */
public record Driver(double powerGrowth, double brakingGrowth) {
  /** Allowed growth rate when braking in a straight line (1/s). */
  public static final double STRAIGHT_LINE_BRAKING = 6;

  /** Lateral acceleration (m/s²) from which the allowance is the one for turns. */
  public static final double BRAKING_FADE = 3;

  public static final Quantity POWER_GROWTH =
      Quantity.si("power_growth_1ps", "largest slide growth rate on power", "1/s", -20, 50, "");
  public static final Quantity BRAKING_GROWTH =
      Quantity.si(
          "braking_growth_1ps", "largest slide growth rate when braking", "1/s", -20, 50, "");

  public static final Driver CAUTIOUS = new Driver(0, 1);
  public static final Driver QUICK = new Driver(1, 2);
  public static final Driver EXPERT = new Driver(2, 3);

  /** Checks both rates. */
  public Driver {
    POWER_GROWTH.check(powerGrowth);
    BRAKING_GROWTH.check(brakingGrowth);
  }

  /** Returns the allowed growth rate (1/s) when braking at a lateral acceleration (m/s²). */
  public double brakingGrowth(double lateralAcceleration) {
    double fade = Math.min(1, Math.abs(lateralAcceleration) / BRAKING_FADE);
    double straight = Math.max(STRAIGHT_LINE_BRAKING, brakingGrowth);
    return straight + (brakingGrowth - straight) * fade;
  }
}
