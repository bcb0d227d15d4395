package rampwright.vehicle.differential;

import rampwright.vehicle.input.Quantity;

/**
 * Open differential. A real bevel differential has a little friction in proportion to its torque;
 * locking values of 0.05 to 0.15 are quoted.
 *
 * @param frictionShare inherent friction as a locking value (-), 0 for the ideal unit
 */
public record OpenDifferential(double frictionShare) implements Differential {
  public static final Quantity FRICTION_SHARE =
      Quantity.si(
          "friction_share", "inherent friction share", "", 0, 0.5, "it was given in percent");

  /** The ideal, frictionless unit. */
  public static final OpenDifferential IDEAL = new OpenDifferential(0);

  /** Checks the share. */
  public OpenDifferential {
    FRICTION_SHARE.check(frictionShare);
  }

  @Override
  public double capacity(double cageTorque) {
    return frictionShare * Math.abs(cageTorque);
  }

  @Override
  public double capacitySlope(double cageTorque) {
    return cageTorque >= 0 ? frictionShare : -frictionShare;
  }
}
