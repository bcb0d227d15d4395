package rampwright.vehicle.differential;

import rampwright.vehicle.input.Quantity;

/**
 * Torque-sensing unit with worm or helical gears: friction of its gears in proportion to the torque
 * that they carry.
 *
 * <pre>
 *   D_cap = P + k |T|      k = (TBR - 1)/(TBR + 1)      TBR = T_slow/T_fast without preload
 * </pre>
 *
 * with a torque bias ratio of its own on power and on overrun. One wheel in the air with no preload
 * leaves no torque to be multiplied: nothing moves the car.
 *
 * @param preload {@code P}: whole torque difference at zero cage torque (N·m)
 * @param driveBias torque bias ratio on power (-)
 * @param coastBias torque bias ratio on overrun (-)
 */
public record TorqueSensingDifferential(double preload, double driveBias, double coastBias)
    implements Differential {
  public static final Quantity DRIVE_BIAS =
      Quantity.si("drive_bias_ratio", "torque bias ratio on power", "", 1, 100, "");
  public static final Quantity COAST_BIAS =
      Quantity.si("coast_bias_ratio", "torque bias ratio on overrun", "", 1, 100, "");

  /** Checks every value. */
  public TorqueSensingDifferential {
    PlateDifferential.PRELOAD.check(preload);
    DRIVE_BIAS.check(driveBias);
    COAST_BIAS.check(coastBias);
  }

  /** Returns the locking value of a torque bias ratio. */
  public static double lockingValue(double biasRatio) {
    return (biasRatio - 1) / (biasRatio + 1);
  }

  @Override
  public double capacity(double cageTorque) {
    return preload + capacitySlope(cageTorque) * cageTorque;
  }

  @Override
  public double capacitySlope(double cageTorque) {
    return cageTorque >= 0 ? lockingValue(driveBias) : -lockingValue(coastBias);
  }
}
