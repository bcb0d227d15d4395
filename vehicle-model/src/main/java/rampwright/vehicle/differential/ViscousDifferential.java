package rampwright.vehicle.differential;

import rampwright.vehicle.input.Quantity;

/**
 * Viscous unit: answers to the speed difference of its outputs and to nothing else.
 *
 * <pre>
 *   D = K dOmega (1 + (dOmega/w)²)^((n - 1)/2)
 * </pre>
 *
 * Newtonian with {@code n = 1}; below 1 the oil thins with shear and the torque rises less than in
 * proportion once the speed difference passes {@code w}, towards the power {@code n} of it.
 *
 * <p>Left out: the rise of torque when heat and pressure bring the plates together (hump), and the
 * unit's own heating over a lap. Sources: linear law with {@code K = 10.47 N·m·s/rad} in Perantoni
 * and Limebeer, Vehicle System Dynamics 52(5), 2014, equation 25; thinning as in the model of
 * Carreau (1972).
 *
 * @param coefficient {@code K}: whole torque difference per small speed difference (N·m·s/rad)
 * @param thinningSpeed {@code w}: speed difference at which thinning sets in (rad/s)
 * @param thinningExponent {@code n}: 1 for a Newtonian oil (-)
 */
public record ViscousDifferential(double coefficient, double thinningSpeed, double thinningExponent)
    implements Differential {
  public static final Quantity COEFFICIENT =
      Quantity.si(
          "coefficient_nmsprad",
          "viscous coefficient (whole torque difference)",
          "N·m·s/rad",
          0,
          1e5,
          "");
  public static final Quantity THINNING_SPEED =
      Quantity.si(
          "thinning_speed_radps",
          "speed difference at which the oil thins",
          "rad/s",
          1e-3,
          1e6,
          "the value is in rpm");
  public static final Quantity THINNING_EXPONENT =
      Quantity.si("thinning_exponent", "shear-thinning exponent", "", 0.05, 1, "");

  /** Checks every value. */
  public ViscousDifferential {
    COEFFICIENT.check(coefficient);
    THINNING_SPEED.check(thinningSpeed);
    THINNING_EXPONENT.check(thinningExponent);
  }

  /** Returns the unit with a Newtonian oil. */
  public static ViscousDifferential newtonian(double coefficient) {
    return new ViscousDifferential(coefficient, 1, 1);
  }

  @Override
  public double capacity(double cageTorque) {
    return 0;
  }

  @Override
  public double capacitySlope(double cageTorque) {
    return 0;
  }

  @Override
  public double viscousTorque(double speedDifference) {
    return coefficient * speedDifference * thinning(speedDifference);
  }

  @Override
  public double viscousSlope(double speedDifference) {
    double x = speedDifference / thinningSpeed;
    double square = x * x;
    return coefficient
        * thinning(speedDifference)
        * (1 + (thinningExponent - 1) * square / (1 + square));
  }

  private double thinning(double speedDifference) {
    double x = speedDifference / thinningSpeed;
    return Math.pow(1 + x * x, (thinningExponent - 1) / 2);
  }
}
