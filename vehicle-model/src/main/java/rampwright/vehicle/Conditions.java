package rampwright.vehicle;

import rampwright.vehicle.input.Quantity;

/**
 * The conditions of a run.
 *
 * @param grip factor on tyre friction, 1 for the surface on which the tyre data were taken (-)
 * @param fuelMass fuel on board (kg), added at the centre of gravity
 * @param airDensity density of the air (kg/m³)
 * @param windSpeed speed of the wind (m/s)
 * @param windFrom direction the wind comes from (rad), anticlockwise from the circuit's x axis
 */
public record Conditions(
    double grip, double fuelMass, double airDensity, double windSpeed, double windFrom) {
  public static final Quantity GRIP =
      Quantity.si("grip", "grip factor", "", 0.05, 2, "it was given in percent");
  public static final Quantity FUEL_MASS =
      Quantity.si("fuel_mass_kg", "fuel mass", "kg", 0, 500, "");
  public static final Quantity AIR_DENSITY =
      Quantity.si("air_density_kgpm3", "air density", "kg/m³", 0, 2, "");
  public static final Quantity WIND_SPEED =
      Quantity.si("wind_speed_mps", "wind speed", "m/s", 0, 40, "");
  public static final Quantity WIND_FROM =
      Quantity.degrees("wind_from_deg", "wind direction", -360, 360, "");

  /** Reference surface, no fuel, sea-level standard air (ISO 2533: 1.225 kg/m³), no wind. */
  public static final Conditions STANDARD = new Conditions(1, 0, 1.225, 0, 0);

  /** Checks every value. */
  public Conditions {
    GRIP.check(grip);
    FUEL_MASS.check(fuelMass);
    AIR_DENSITY.check(airDensity);
    WIND_SPEED.check(windSpeed);
    WIND_FROM.check(windFrom);
  }

  /** Returns these conditions with another grip factor. */
  public Conditions withGrip(double newGrip) {
    return new Conditions(newGrip, fuelMass, airDensity, windSpeed, windFrom);
  }
}
