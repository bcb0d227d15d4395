package rampwright.vehicle.differential;

import rampwright.vehicle.input.Quantity;

/**
 * Silicone oil of a viscous unit.
 *
 * <pre>
 *   log10 eta(T) = 763.1/(273 + T) - 2.559 + log10 eta25
 * </pre>
 *
 * with T in °C: form and constants of a maker's data sheet, from memory. Heat changes the
 * slow-shear viscosity only; where thinning sets in is taken as constant.
 *
 * @param viscosity25 dynamic viscosity at 25 °C and slow shear (Pa·s)
 * @param thinningRate shear rate at which the oil thins (1/s)
 * @param thinningExponent power of shear rate that the stress follows beyond it (-)
 */
public record SiliconeOil(double viscosity25, double thinningRate, double thinningExponent) {
  public static final Quantity VISCOSITY =
      Quantity.si(
          "viscosity_25c_pas", "viscosity at 25 °C", "Pa·s", 1e-4, 1000, "the value is in mPa·s");
  public static final Quantity THINNING_RATE =
      Quantity.si("thinning_rate_1ps", "shear rate at which the oil thins", "1/s", 1, 1e9, "");
  public static final Quantity TEMPERATURE =
      Quantity.si("temperature_c", "oil temperature", "°C", -40, 300, "");

  /** Checks every value. */
  public SiliconeOil {
    VISCOSITY.check(viscosity25);
    THINNING_RATE.check(thinningRate);
    ViscousDifferential.THINNING_EXPONENT.check(thinningExponent);
  }

  /** Returns the viscosity (Pa·s) for slow shear at a temperature (°C). */
  public double viscosity(double temperature) {
    TEMPERATURE.check(temperature);
    return viscosity25 * Math.pow(10, 763.1 / (273 + temperature) - 2.559);
  }
}
