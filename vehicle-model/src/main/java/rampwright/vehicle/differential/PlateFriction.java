package rampwright.vehicle.differential;

import rampwright.vehicle.input.Quantity;

/**
 * How the friction of plates changes with sliding speed and temperature, relative to breakaway at
 * the temperature at which the unit's figures were taken.
 *
 * <pre>
 *   sliding/breakaway = r + (1 - r) exp(-|dOmega|/w)        temperature: 1 - fade (T - T_ref)
 * </pre>
 *
 * The temperature factor is not below {@link #LEAST_FACTOR}. A ratio {@code r} below 1 (sintered
 * plates in plain oil: 0.5 to 0.6 in Neale, <i>The Tribology Handbook</i>, Table 7.4) grabs and
 * shudders; one above 1 slides smoothly. The form between the two ends is ours.
 *
 * @param slidingRatio {@code r}: friction at fast sliding over breakaway (-)
 * @param slidingSpeed {@code w}: output speed difference over which it changes (rad/s)
 * @param temperature plate temperature (°C)
 * @param referenceTemperature temperature at which the unit's figures hold (°C)
 * @param fade share of friction lost per degree (1/K), negative when it gains
 */
public record PlateFriction(
    double slidingRatio,
    double slidingSpeed,
    double temperature,
    double referenceTemperature,
    double fade) {
  public static final Quantity SLIDING_RATIO =
      Quantity.si("sliding_ratio", "sliding over breakaway friction", "", 0.2, 1.5, "");
  public static final Quantity SLIDING_SPEED =
      Quantity.si(
          "sliding_speed_radps",
          "output speed difference over which friction changes",
          "rad/s",
          1e-3,
          1000,
          "");
  public static final Quantity TEMPERATURE =
      Quantity.si("plate_temperature_c", "plate temperature", "°C", -40, 600, "");
  public static final Quantity REFERENCE_TEMPERATURE =
      Quantity.si("reference_temperature_c", "reference plate temperature", "°C", -40, 600, "");
  public static final Quantity FADE =
      Quantity.si("friction_fade_1pk", "friction fade per degree", "1/K", -0.02, 0.02, "");

  /** Friction never falls below this share of the reference by heat (-). */
  public static final double LEAST_FACTOR = 0.2;

  /** Friction that stays the same. */
  public static final PlateFriction CONSTANT = new PlateFriction(1, 1, 80, 80, 0);

  /** Checks every value. */
  public PlateFriction {
    SLIDING_RATIO.check(slidingRatio);
    SLIDING_SPEED.check(slidingSpeed);
    TEMPERATURE.check(temperature);
    REFERENCE_TEMPERATURE.check(referenceTemperature);
    FADE.check(fade);
  }

  /** Returns the factor of heat on friction (-). */
  public double temperatureFactor() {
    return Math.max(LEAST_FACTOR, 1 - fade * (temperature - referenceTemperature));
  }

  /** Returns sliding over breakaway friction (-) at an output speed difference (rad/s). */
  public double slidingFactor(double speedDifference) {
    return slidingRatio + (1 - slidingRatio) * Math.exp(-Math.abs(speedDifference) / slidingSpeed);
  }

  /** Returns the derivative of the sliding factor (s/rad). */
  public double slidingFactorSlope(double speedDifference) {
    return -Math.signum(speedDifference)
        * (1 - slidingRatio)
        / slidingSpeed
        * Math.exp(-Math.abs(speedDifference) / slidingSpeed);
  }
}
