package rampwright.vehicle.balance;

import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.PlateFriction;
import rampwright.vehicle.differential.RefinedPlateDifferential;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapRequest;
import rampwright.vehicle.lap.LapSolver;

/**
 * The lap of a long stint, on which the plates have the friction of the temperature that this very
 * lap gives them.
 *
 * <p>Hot plates grip less (or more), so the unit locks less, so it slides differently and runs at
 * another temperature. The fixed point is found by taking turns: lap, heat, mean plate temperature,
 * lap. Assumption: friction follows the mean plate temperature of the settled lap, not the
 * temperature of the moment. Units whose law does not know {@link PlateFriction#fade} need one lap.
 *
 * @param lap the lap
 * @param heat heat of the unit on it
 * @param temperature plate temperature with which the lap was solved (°C)
 * @param change mean plate temperature of the lap less {@code temperature} (K): what is left of the
 *     search for the fixed point
 */
public record SettledLap(Lap lap, PlateHeat heat, double temperature, double change) {
  /** Change of temperature (K) at which the search ends. */
  public static final double TOLERANCE = 0.2;

  private static final int MOST_LAPS = 15;

  /**
   * Finds the fixed point.
   *
   * @param request the lap with its law at any temperature
   * @param unit which differential heats up
   * @param cooling its heat flow
   * @param frictionArea friction area of all its faces (m²)
   */
  public static SettledLap of(
      LapRequest request, UnitPosition unit, PlateCooling cooling, double frictionArea) {
    double temperature = cooling.airTemperature();
    SettledLap found = at(request, unit, cooling, frictionArea, temperature);
    if (!fades(unit.of(request.differentials()))) {
      return new SettledLap(found.lap, found.heat, temperature + found.change, 0);
    }
    for (int k = 0; k < MOST_LAPS && Math.abs(found.change) > TOLERANCE; k++) {
      SettledLap before = found;
      temperature += step(before, k);
      found = at(request, unit, cooling, frictionArea, temperature);
    }
    return found;
  }

  /** Full steps at first; half of one later, should the two keep changing places. */
  private static double step(SettledLap from, int k) {
    return k < 5 ? from.change : from.change / 2;
  }

  private static boolean fades(Differential law) {
    return law instanceof RefinedPlateDifferential refined && refined.friction().fade() != 0;
  }

  private static SettledLap at(
      LapRequest request,
      UnitPosition unit,
      PlateCooling cooling,
      double frictionArea,
      double temperature) {
    DifferentialSet set = request.differentials();
    Differential law = unit.of(set);
    DifferentialSet warm = fades(law) ? unit.with(set, warmed(law, temperature)) : set;
    Lap lap =
        LapSolver.solve(
            new LapRequest(
                request.car(),
                warm,
                request.conditions(),
                request.driver(),
                request.form(),
                request.circuit(),
                request.spacing()));
    PlateHeat heat = PlateHeat.of(lap, unit, cooling, frictionArea, 1, cooling.airTemperature());
    return new SettledLap(lap, heat, temperature, heat.settled().meanPlates() - temperature);
  }

  private static Differential warmed(Differential law, double temperature) {
    RefinedPlateDifferential refined = (RefinedPlateDifferential) law;
    PlateFriction f = refined.friction();
    return new RefinedPlateDifferential(
        refined.nominal(),
        refined.sideGearShare(),
        refined.preloadPath(),
        new PlateFriction(
            f.slidingRatio(), f.slidingSpeed(), temperature, f.referenceTemperature(), f.fade()));
  }
}
