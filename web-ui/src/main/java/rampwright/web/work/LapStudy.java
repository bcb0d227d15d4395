package rampwright.web.work;

import rampwright.optimiser.event.NamedSetting;
import rampwright.vehicle.balance.LapReport;
import rampwright.vehicle.lap.Lap;

/**
 * A setting, its lap and what the lap says about the car.
 *
 * @param setting the setting
 * @param lap its lap
 * @param report what it says
 */
public record LapStudy(NamedSetting setting, Lap lap, LapReport report) {}
