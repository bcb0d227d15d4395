package rampwright.planted.vehicle.trim;

import rampwright.planted.vehicle.lap.LapThatRollsDice;

/** Closes a circle between trim and lap on purpose. */
public final class TrimThatKnowsTheLap {
  LapThatRollsDice lap() {
    return new LapThatRollsDice(this);
  }
}
