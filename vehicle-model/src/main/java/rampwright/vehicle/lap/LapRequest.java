package rampwright.vehicle.lap;

import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.input.Quantity;

/**
 * Everything a lap depends on. Equal requests have equal laps.
 *
 * @param car the car
 * @param differentials its differentials
 * @param conditions the conditions
 * @param driver the driver's limits
 * @param form whose limits count
 * @param circuit the line
 * @param spacing wanted distance between stations (m); rounded so that a whole number fits the lap
 */
public record LapRequest(
    Car car,
    DifferentialSet differentials,
    Conditions conditions,
    Driver driver,
    LimitForm form,
    Circuit circuit,
    double spacing) {
  public static final Quantity SPACING =
      Quantity.si("station_spacing_m", "station spacing", "m", 0.1, 50, "");

  /** Checks the spacing. */
  public LapRequest {
    SPACING.check(spacing);
  }
}
