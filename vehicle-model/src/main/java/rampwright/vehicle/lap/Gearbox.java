package rampwright.vehicle.lap;

import rampwright.vehicle.driveline.Driveline;

/**
 * When gears change. A gear is held up to the cage speed at which the next one has more torque, or
 * the rev limit; a change leaves the car without drive torque for the shift time.
 */
final class Gearbox {
  /** Share of the shift speed below which the lower gear is taken again. */
  private static final double HYSTERESIS = 0.85;

  private final Driveline driveline;
  private final double[] upshift;

  Gearbox(Driveline driveline) {
    this.driveline = driveline;
    this.upshift = new double[driveline.gears() + 1];
    for (int gear = 1; gear < driveline.gears(); gear++) {
      upshift[gear] = crossing(gear);
    }
    upshift[driveline.gears()] = Double.POSITIVE_INFINITY;
  }

  double shiftTime() {
    return driveline.shiftTime();
  }

  /** Returns the cage torque (N·m) at full load in a gear at a cage speed (rad/s). */
  double fullTorque(int gear, double cageSpeed) {
    return driveline.fullTorque(gear, cageSpeed);
  }

  /** Returns the cage speed (rad/s) at which a gear is left upwards; infinite in top gear. */
  double upshiftSpeed(int gear) {
    return upshift[gear];
  }

  /** Returns the gear for a cage speed (rad/s) when any may be taken. */
  int best(double cageSpeed) {
    int gear = 1;
    while (cageSpeed >= upshift[gear]) {
      gear++;
    }
    return gear;
  }

  /** Returns the gear to accelerate on in after a slower stretch: the one held, or a lower one. */
  int keepOrLower(int gear, double cageSpeed) {
    int kept = gear;
    while (kept > 1 && cageSpeed < HYSTERESIS * upshift[kept - 1]) {
      kept--;
    }
    return kept;
  }

  /** First speed below the rev limit from which the next gear has at least as much torque. */
  private double crossing(int gear) {
    double limit = driveline.engine().revLimit() / driveline.ratio(gear);
    int steps = 400;
    for (int i = 1; i <= steps; i++) {
      double high = limit * i / steps;
      if (gain(gear, high) >= 0) {
        return bisect(gear, limit * (i - 1) / steps, high);
      }
    }
    return limit;
  }

  private double bisect(int gear, double lowest, double highest) {
    double low = lowest;
    double high = highest;
    for (int k = 0; k < 60; k++) {
      double middle = (low + high) / 2;
      if (gain(gear, middle) >= 0) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return high;
  }

  private double gain(int gear, double cageSpeed) {
    return driveline.fullTorque(gear + 1, cageSpeed) - driveline.fullTorque(gear, cageSpeed);
  }
}
