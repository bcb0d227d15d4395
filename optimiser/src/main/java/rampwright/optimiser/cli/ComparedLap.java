package rampwright.optimiser.cli;

import rampwright.optimiser.event.NamedSetting;
import rampwright.vehicle.balance.GapSplit;
import rampwright.vehicle.balance.LapReport;
import rampwright.vehicle.lap.Lap;

/**
 * The lap of a setting with the driver's limits and its gap to the first setting's.
 *
 * @param setting the setting
 * @param lap its lap
 * @param report what the lap says
 * @param gap its gap to the reference, positive where it loses
 */
record ComparedLap(NamedSetting setting, Lap lap, LapReport report, GapSplit gap) {}
