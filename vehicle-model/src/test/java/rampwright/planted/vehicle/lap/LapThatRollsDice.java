package rampwright.planted.vehicle.lap;

import java.util.Random;
import rampwright.planted.vehicle.trim.TrimThatKnowsTheLap;

/** Draws a random number and knows the trim on purpose. */
public final class LapThatRollsDice {
  final double draw = new Random(1).nextDouble();
  final TrimThatKnowsTheLap trim;

  /**
   * Joins the lap to its trim.
   *
   * @param trim the trim that knows the lap in turn
   */
  public LapThatRollsDice(TrimThatKnowsTheLap trim) {
    this.trim = trim;
  }
}
