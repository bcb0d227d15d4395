package rampwright.optimiser.search;

/**
 * What the laps of one law say about it.
 *
 * @param lapTime sum of the circuits' lap times, each times its circuit's weight (s)
 */
record LapFigures(double lapTime) {}
