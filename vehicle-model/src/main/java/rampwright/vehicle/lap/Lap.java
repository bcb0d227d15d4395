package rampwright.vehicle.lap;

import rampwright.vehicle.circuit.Road;

/**
 * A solved lap.
 *
 * @param request what was asked
 * @param time lap time (s)
 * @param road the line as it was sampled
 * @param trace everything at every station
 */
public record Lap(LapRequest request, double time, Road road, Trace trace) {
  /** Returns what limits the car at a station. */
  public LapLimit limit(int station) {
    return LapLimit.values()[(int) trace.get(Channel.LIMIT, station)];
  }
}
