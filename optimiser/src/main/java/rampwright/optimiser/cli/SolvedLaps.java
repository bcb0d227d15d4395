package rampwright.optimiser.cli;

import java.util.Locale;
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

  /** Returns a name for a file about one of the two laps. */
  String fileName(String form) {
    String all = circuit.name() + "_" + setting.name() + "_" + form;
    return all.toLowerCase(Locale.ROOT).replaceAll("[^\\p{L}\\p{N}_]+", "-") + ".csv";
  }
}
