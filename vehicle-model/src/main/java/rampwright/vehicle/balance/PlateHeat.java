package rampwright.vehicle.balance;

import java.util.ArrayList;
import java.util.List;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;
import rampwright.vehicle.lap.Lap;

/**
 * Heat in one differential over a lap and over a stint of equal laps. The lap's sliding power does
 * not answer to the temperature.
 *
 * @param energy heat per lap (J)
 * @param peakPower largest sliding power (W)
 * @param wearPerArea friction work per friction area over 100 km (J/m²): by Archard's law (1953)
 *     wear is in proportion to it, so it compares settings on the same plates, not plates
 * @param laps each lap of the stint
 * @param settled the lap that a long stint leads to
 */
public record PlateHeat(
    double energy, double peakPower, double wearPerArea, List<LapHeat> laps, LapHeat settled) {
  /** Distance (m) for which wear is reported. */
  public static final double WEAR_DISTANCE = 100e3;

  public static final Quantity FRICTION_AREA =
      new Quantity("friction_area_mm2", "friction area", "mm²", 1e-6, 10, 1e7, "");
  public static final Quantity START_TEMPERATURE =
      Quantity.si("start_temperature_c", "temperature at the start of a stint", "°C", -50, 300, "");
  public static final Quantity LAPS = Quantity.si("laps", "laps of a stint", "", 1, 1000, "");

  /**
   * Temperatures over one lap.
   *
   * @param hottestPlates highest plate temperature (°C)
   * @param hottestAt distance from the start line where it is reached (m)
   * @param meanPlates mean plate temperature over time (°C)
   * @param end temperatures at the end of the lap
   */
  public record LapHeat(
      double hottestPlates, double hottestAt, double meanPlates, PlateTemperature end) {}

  /** Copies the laps. */
  public PlateHeat {
    laps = List.copyOf(laps);
  }

  /**
   * Follows a stint that starts with plates and oil at one temperature.
   *
   * @param lap the lap that is driven again and again; of a closed circuit
   * @param unit which differential
   * @param cooling its heat flow
   * @param frictionArea friction area of all its faces (m²)
   * @param count number of laps
   * @param start temperature at the start (°C)
   */
  public static PlateHeat of(
      Lap lap,
      UnitPosition unit,
      PlateCooling cooling,
      double frictionArea,
      int count,
      double start) {
    FRICTION_AREA.check(frictionArea);
    LAPS.check(count);
    START_TEMPERATURE.check(start);
    if (!lap.road().closed()) {
      throw InvalidInput.of("circuit of a stint", lap.request().circuit().name(), "closed", "");
    }
    HeatedLap heated = new HeatedLap(lap, unit, cooling);
    List<LapHeat> laps = new ArrayList<>();
    PlateTemperature now = new PlateTemperature(start, start);
    for (int k = 0; k < count; k++) {
      laps.add(heated.drive(now));
      now = laps.get(k).end();
    }
    double wear = heated.energy() / frictionArea * WEAR_DISTANCE / lap.road().length();
    return new PlateHeat(
        heated.energy(), heated.peakPower(), wear, laps, heated.drive(heated.settledStart()));
  }
}
