package rampwright.vehicle.balance;

import rampwright.vehicle.input.Quantity;

/**
 * How the plates of a unit get rid of their heat: two lumps, the plates and the oil with the case.
 *
 * <pre>
 *   Cp dTp/dt = P - G1 (Tp - To)            Cp plateMass * specificHeat
 *   Co dTo/dt = G1 (Tp - To) - G2 (To - Ta)
 * </pre>
 *
 * Assumptions: one temperature in all plates (the friction surface is hotter for an instant), heat
 * transfer in proportion to the temperature difference, air flow the same all around the lap. The
 * transfer coefficients of a car are best found from one measured oil temperature.
 *
 * @param plateMass mass of all plates (kg)
 * @param specificHeat specific heat of the plates (J/(kg·K)), about 460 for steel
 * @param plateToOil {@code G1}: heat flow from plates to oil per difference (W/K)
 * @param oilCapacity {@code Co}: heat capacity of oil and case (J/K)
 * @param oilToAir {@code G2}: heat flow from the case to the air per difference (W/K)
 * @param airTemperature {@code Ta}: temperature of the air (°C)
 */
public record PlateCooling(
    double plateMass,
    double specificHeat,
    double plateToOil,
    double oilCapacity,
    double oilToAir,
    double airTemperature) {
  public static final Quantity PLATE_MASS =
      Quantity.si("plate_mass_kg", "mass of the plates", "kg", 0.01, 100, "");
  public static final Quantity SPECIFIC_HEAT =
      Quantity.si("plate_specific_heat_jpkgk", "specific heat", "J/(kg·K)", 50, 5000, "");
  public static final Quantity PLATE_TO_OIL =
      Quantity.si("plate_to_oil_wpk", "heat flow from plates to oil", "W/K", 1e-6, 1e5, "");
  public static final Quantity OIL_CAPACITY =
      Quantity.si("oil_heat_capacity_jpk", "heat capacity of oil and case", "J/K", 10, 1e12, "");
  public static final Quantity OIL_TO_AIR =
      Quantity.si("oil_to_air_wpk", "heat flow from the case to the air", "W/K", 1e-6, 1e12, "");
  public static final Quantity AIR_TEMPERATURE =
      Quantity.si("air_temperature_c", "air temperature", "°C", -50, 80, "");

  /**
   * A medium unit in air of 25 °C: 1.6 kg of steel plates, half a litre of oil in an 8 kg case. The
   * transfer coefficients are an estimate of ours without a published source.
   */
  public static final PlateCooling TYPICAL = new PlateCooling(1.6, 460, 60, 5000, 15, 25);

  /** Checks every value. */
  public PlateCooling {
    PLATE_MASS.check(plateMass);
    SPECIFIC_HEAT.check(specificHeat);
    PLATE_TO_OIL.check(plateToOil);
    OIL_CAPACITY.check(oilCapacity);
    OIL_TO_AIR.check(oilToAir);
    AIR_TEMPERATURE.check(airTemperature);
  }

  /** Returns the heat capacity of the plates (J/K). */
  public double plateCapacity() {
    return plateMass * specificHeat;
  }

  /** Returns the temperatures that a constant sliding power (W) leads to. */
  public PlateTemperature settled(double power) {
    double oil = airTemperature + power / oilToAir;
    return new PlateTemperature(oil + power / plateToOil, oil);
  }

  /**
   * Returns the temperatures after a time (s) at constant sliding power (W): the exact solution, so
   * the length of the step does not matter.
   */
  public PlateTemperature after(PlateTemperature start, double power, double time) {
    PlateTemperature end = settled(power);
    double a11 = -plateToOil / plateCapacity();
    double a12 = -a11;
    double a21 = plateToOil / oilCapacity;
    double a22 = -(plateToOil + oilToAir) / oilCapacity;
    double half = (a11 + a22) / 2;
    double root = Math.sqrt((a11 - a22) * (a11 - a22) / 4 + a12 * a21);
    // exp(A t) = exp(half t) (cosh(root t) I + sinh(root t)/root (A - half I))
    double slow = Math.exp((half + root) * time);
    double fast = Math.exp((half - root) * time);
    double even = (slow + fast) / 2;
    double odd = (slow - fast) / (2 * root);
    double plates = start.plates() - end.plates();
    double oil = start.oil() - end.oil();
    return new PlateTemperature(
        end.plates() + even * plates + odd * ((a11 - half) * plates + a12 * oil),
        end.oil() + even * oil + odd * (a21 * plates + (a22 - half) * oil));
  }
}
