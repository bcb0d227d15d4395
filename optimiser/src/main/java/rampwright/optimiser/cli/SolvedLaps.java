package rampwright.optimiser.cli;

import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.vehicle.balance.LapAnalysis;
import rampwright.vehicle.balance.LapReport;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapSolver;
import rampwright.vehicle.lap.LimitForm;

/**
 * The two laps of a setting on a circuit.
 *
 * @param circuit the circuit
 * @param setting the setting
 * @param driver the lap with the driver's limits
 * @param driverReport what it says
 * @param car the lap with the car's limits
 * @param carReport what it says
 */
record SolvedLaps(
    Circuit circuit,
    NamedSetting setting,
    Lap driver,
    LapReport driverReport,
    Lap car,
    LapReport carReport) {
  static SolvedLaps of(Event event, Circuit circuit, NamedSetting setting) {
    Lap driver = LapSolver.solve(event.lapRequest(setting, circuit, LimitForm.DRIVER));
    Lap car = LapSolver.solve(event.lapRequest(setting, circuit, LimitForm.CAR));
    return new SolvedLaps(
        circuit, setting, driver, LapAnalysis.report(driver), car, LapAnalysis.report(car));
  }

  /** Returns a name for a file about one of the two laps; no other lap has the same. */
  String fileName(String form) {
    return safe(circuit.name()) + "_" + safe(setting.name()) + "_" + form + ".csv";
  }

  /** Blanks become hyphens, and what a file system may not like is told by its code. */
  private static String safe(String name) {
    StringBuilder safe = new StringBuilder();
    name.codePoints()
        .forEach(
            c -> {
              if (Character.isLetterOrDigit(c)) {
                safe.appendCodePoint(c);
              } else {
                safe.append(c == ' ' ? "-" : "~" + Integer.toHexString(c));
              }
            });
    return safe.toString();
  }
}
