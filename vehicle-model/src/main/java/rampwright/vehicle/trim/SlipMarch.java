package rampwright.vehicle.trim;

import rampwright.vehicle.tyre.Tyre;

/**
 * Finds the drive or brake limit by following the branch of trims in the mean slip of the active
 * wheels, a parameter that does not fold where torque does.
 *
 * <p>With some lock at low speed the torque can rise to a first peak, dip while the inside wheel's
 * speed climbs to the outside wheel's, and rise again once the unit sticks. On the throttle the car
 * snaps across the dip; so the whole range is followed, the global extreme is taken, and states in
 * which torque falls with slip, or lies below a torque reached earlier, are crossed in a jump: they
 * are neither steady states nor asked for stability. Nor is the short stretch before such a dip
 * where torque rises by less than a fifth of its first slope, because there the inside wheel's
 * speed, not the car, is about to run away.
 *
 * <p>A workspace, one instance per thread and per mode (driving or braking).
 */
final class SlipMarch {
  private static final int MOST_STATES = 96;

  /** Share of the slip at the tyre's peak that one step covers. */
  private static final double STEP = 0.15;

  /** Growth of the step once torque falls. */
  private static final double GROWTH = 1.4;

  /** The branch is followed to this multiple of the slip at the tyre's peak. */
  private static final double RANGE = 4;

  private static final double SMALLEST_STEP = 1e-5;
  private static final double RUNAWAY_SLOPE = 0.2;

  private final Equilibrium equilibrium;
  private final Stability stability;
  private final boolean braking;
  private final int direction;
  private final TrimState[] states = new TrimState[MOST_STATES];
  private final TrimState trial = new TrimState();
  private final TrimState low = new TrimState();
  private final TrimState high = new TrimState();

  private int count;
  private int referenceSign;
  private double growthMax;
  private TorqueCap cap;

  /** How much torque is left until the engine or the brakes have no more. */
  interface TorqueCap {
    /** Returns the torque left (N·m) at a state. */
    double headroom(TrimState state);

    /** Solves for the state at which nothing is left; returns whether that converged. */
    boolean solve(Equilibrium equilibrium, TrimState state);
  }

  SlipMarch(Equilibrium equilibrium, Stability stability) {
    this.equilibrium = equilibrium;
    this.stability = stability;
    this.braking = equilibrium.driveline.braking;
    this.direction = braking ? -1 : 1;
    for (int i = 0; i < MOST_STATES; i++) {
      states[i] = new TrimState();
    }
  }

  /**
   * Finds the limit.
   *
   * @param start a state of the branch from which torque rises
   * @param torqueCap what engine or brakes allow
   * @param largestGrowth largest growth rate that the driver masters (1/s), infinite for the car's
   *     limit
   * @param sign determinant sign of the branch that is joined to straight running
   * @param out receives the limit
   */
  TrimLimit find(
      TrimState start, TorqueCap torqueCap, double largestGrowth, int sign, TrimState out) {
    cap = torqueCap;
    growthMax = largestGrowth;
    referenceSign = sign;
    count = 1;
    states[0].copyFrom(start);
    if (grows(states[0])) {
      out.copyFrom(states[0]);
      return TrimLimit.DRIVER;
    }
    if (cap.headroom(states[0]) <= 0) {
      out.copyFrom(states[0]);
      return TrimLimit.TORQUE;
    }
    boolean capped = march();
    return choose(capped, out);
  }

  /** Returns the torque slope below which a state may lie before a dip (N·m). */
  double runawaySlope() {
    return RUNAWAY_SLOPE * torqueSlope(states[0]);
  }

  /** Returns whether torque dipped and rose again on the branch that was followed last. */
  boolean sawDip() {
    boolean fell = false;
    for (int i = 1; i < count; i++) {
      if (fell && torqueSlope(states[i]) > 0) {
        return true;
      }
      fell |= torqueSlope(states[i]) < 0;
    }
    return false;
  }

  private double torque(TrimState s) {
    return braking ? s.brakeTorque : s.cageTorque;
  }

  private double torqueSlope(TrimState s) {
    return direction * s.torqueRate;
  }

  private double gain(TrimState s) {
    return braking ? -s.ax : s.ax;
  }

  /** Slope of the gain along the march, in which the mean slip moves away from zero. */
  private double gainSlope(TrimState s) {
    return direction * (braking ? -s.axRate : s.axRate);
  }

  private boolean grows(TrimState s) {
    if (growthMax == Double.POSITIVE_INFINITY) {
      return false;
    }
    if (Double.isNaN(s.sigma)) {
      stability.evaluate(equilibrium.forces, equilibrium.driveline, s.speed, s.sideslip);
      s.sigma = stability.sigma;
    }
    return s.sigma > growthMax;
  }

  private boolean solveAt(TrimState from, double meanSlip, TrimState to) {
    to.predict(from, meanSlip - from.meanSlip);
    return equilibrium.atMeanSlip(to, meanSlip) && to.determinantSign == referenceSign;
  }

  /** Follows the branch; returns whether it ended at the torque cap. */
  private boolean march() {
    Tyre tyre = equilibrium.forces.tyreModel(braking ? 0 : equilibrium.driveline.activeWheels[0]);
    double peakSlip = tyre.slipAtPeak(equilibrium.forces.weight / 4);
    double step = STEP * peakSlip;
    double largestStep = step;
    double end = RANGE * peakSlip;
    double firstSlope = torqueSlope(states[0]);
    double mostTorque = torque(states[0]);
    while (count < MOST_STATES && Math.abs(states[count - 1].meanSlip) < end) {
      TrimState last = states[count - 1];
      TrimState next = states[count];
      if (!solveAt(last, last.meanSlip + direction * step, next)) {
        step /= 2;
        if (step < SMALLEST_STEP) {
          return false;
        }
        continue;
      }
      boolean rising = torqueSlope(next) > 0 && torque(next) > mostTorque;
      if (rising && cap.headroom(next) <= 0) {
        return reachCap(last, next);
      }
      count++;
      boolean tooFast = rising && grows(next);
      mostTorque = Math.max(mostTorque, torque(next));
      if (tooFast && torqueSlope(next) >= RUNAWAY_SLOPE * firstSlope || finished(next)) {
        return false;
      }
      if (torqueSlope(next) < 0) {
        largestStep *= GROWTH;
      }
      step = Math.min(step * 2, largestStep);
    }
    return false;
  }

  /** Replaces the state beyond the cap by the one at it. */
  private boolean reachCap(TrimState last, TrimState beyond) {
    low.copyFrom(last);
    high.copyFrom(beyond);
    double left = cap.headroom(low);
    double over = cap.headroom(high);
    trial.predict(low, (high.meanSlip - low.meanSlip) * left / (left - over));
    boolean solved = cap.solve(equilibrium, trial) && between(trial.meanSlip);
    for (int i = 0; !solved && i < 60; i++) {
      double middle = (low.meanSlip + high.meanSlip) / 2;
      if (!solveAt(low, middle, trial)) {
        break;
      }
      (cap.headroom(trial) > 0 ? low : high).copyFrom(trial);
      solved = Math.abs(high.meanSlip - low.meanSlip) < 1e-12;
    }
    if (!solved) {
      trial.copyFrom(low);
    }
    grows(trial);
    states[count++].copyFrom(trial);
    return true;
  }

  private boolean between(double meanSlip) {
    return (meanSlip - low.meanSlip) * direction >= -1e-9
        && (high.meanSlip - meanSlip) * direction >= -1e-9;
  }

  /** Whether torque cannot rise again beyond this state. */
  private boolean finished(TrimState state) {
    if (torqueSlope(state) >= 0) {
      return false;
    }
    DrivelineEquations driveline = equilibrium.driveline;
    if (driveline.centre != null) {
      return false;
    }
    if (braking) {
      return spent(0) && spent(1) || spent(2) && spent(3);
    }
    DifferentialEquation differential = driveline.differentials[0];
    int left = driveline.activeWheels[0];
    return switch (differential.state) {
      case FRICTIONLESS -> spent(left) || spent(left + 1);
      case LEFT_FASTER -> spent(left);
      case RIGHT_FASTER -> spent(left + 1);
      case STICKING -> spent(left) && spent(left + 1);
    };
  }

  /** Whether more slip gives a wheel less force. */
  private boolean spent(int wheel) {
    return equilibrium.forces.tyre[wheel].fxSlip < 0;
  }

  private TrimLimit choose(boolean capped, TrimState out) {
    double firstSlope = torqueSlope(states[0]);
    int best = 0;
    int lastSteady = 0;
    double mostTorque = torque(states[0]);
    for (int i = 1; i < count; i++) {
      TrimState s = states[i];
      boolean rising = torqueSlope(s) > 0 && torque(s) > mostTorque;
      mostTorque = Math.max(mostTorque, torque(s));
      if (!rising || torqueSlope(s) < RUNAWAY_SLOPE * firstSlope && dipFollows(i)) {
        continue;
      }
      if (grows(s)) {
        return crossing(lastSteady, i, best, out);
      }
      lastSteady = i;
      if (gain(s) > gain(states[best])) {
        best = i;
      }
    }
    if (capped && best == count - 1) {
      out.copyFrom(states[best]);
      return TrimLimit.TORQUE;
    }
    return extreme(lastSteady, best, out);
  }

  /** Whether torque falls after a state and later exceeds what it had reached. */
  private boolean dipFollows(int i) {
    double peak = torque(states[i]);
    boolean fell = false;
    for (int j = i + 1; j < count; j++) {
      if (fell && torque(states[j]) > peak) {
        return true;
      }
      fell |= torqueSlope(states[j]) < 0;
      peak = Math.max(peak, torque(states[j]));
    }
    return false;
  }

  /** The extreme of the acceleration at or after the best steady state. */
  private TrimLimit extreme(int lastSteady, int best, TrimState out) {
    out.copyFrom(states[best]);
    int next = best + 1;
    if (best != lastSteady || next >= count || gainSlope(states[best]) <= 0) {
      // the branch ended, or the acceleration already fell while torque still rose
      if (best > 0 && gainSlope(states[best]) <= 0) {
        refineExtreme(states[best - 1], states[best], out);
      }
    } else {
      refineExtreme(states[best], states[next], out);
    }
    if (out.sigma > growthMax) {
      return bisectGrowth(states[best], out, out);
    }
    return TrimLimit.TYRES;
  }

  /** Illinois search for zero slope of the acceleration between a rising and a falling state. */
  private void refineExtreme(TrimState rising, TrimState falling, TrimState out) {
    low.copyFrom(rising);
    high.copyFrom(falling);
    double slopeLow = gainSlope(low);
    double slopeHigh = gainSlope(high);
    if (!(slopeLow > 0) || !(slopeHigh < 0)) {
      keepBetter(rising, falling, out);
      return;
    }
    int side = 0;
    for (int i = 0; i < 40; i++) {
      double share = slopeLow / (slopeLow - slopeHigh);
      double meanSlip = low.meanSlip + share * (high.meanSlip - low.meanSlip);
      if (!solveAt(low, meanSlip, trial)) {
        break;
      }
      double slope = gainSlope(trial);
      boolean converged =
          Math.abs(slope * (high.meanSlip - low.meanSlip)) < 1e-6
              || Math.abs(high.meanSlip - low.meanSlip) < 1e-8;
      if (slope > 0) {
        low.copyFrom(trial);
        slopeLow = slope;
        slopeHigh *= side == 1 ? 0.5 : 1;
        side = 1;
      } else {
        high.copyFrom(trial);
        slopeHigh = slope;
        slopeLow *= side == -1 ? 0.5 : 1;
        side = -1;
      }
      if (converged) {
        break;
      }
    }
    keepBetter(low, high, out);
  }

  private void keepBetter(TrimState a, TrimState b, TrimState out) {
    TrimState better = gain(a) >= gain(b) ? a : b;
    // solved once more so that forces and stability belong to the state that is kept
    if (solveAt(better, better.meanSlip, trial)) {
      grows(trial);
      out.copyFrom(trial);
    } else {
      out.copyFrom(better);
    }
  }

  /** The growth rate first exceeds the driver's at state {@code i}. */
  private TrimLimit crossing(int lastSteady, int i, int best, TrimState out) {
    if (lastSteady == i - 1) {
      bisectGrowth(states[lastSteady], states[i], out);
    } else {
      land(lastSteady, i, out);
    }
    if (gain(states[best]) > gain(out)) {
      out.copyFrom(states[best]);
    }
    return TrimLimit.DRIVER;
  }

  /** Between the last steady state and state {@code i} lies a jump. */
  private void land(int lastSteady, int i, TrimState out) {
    double mostTorque = torque(states[0]);
    for (int j = 1; j < i; j++) {
      mostTorque = Math.max(mostTorque, torque(states[j]));
    }
    low.copyFrom(states[i - 1]);
    high.copyFrom(states[i]);
    for (int k = 0; k < 50 && Math.abs(high.meanSlip - low.meanSlip) > 1e-9; k++) {
      if (!solveAt(low, (low.meanSlip + high.meanSlip) / 2, trial)) {
        break;
      }
      (torque(trial) > mostTorque ? high : low).copyFrom(trial);
    }
    if (solveAt(high, high.meanSlip, trial) && !grows(trial)) {
      high.copyFrom(trial);
      bisectGrowth(high, states[i], out);
    } else {
      out.copyFrom(states[lastSteady]);
    }
  }

  /** Finds where the growth rate reaches the driver's limit; keeps the side below it. */
  private TrimLimit bisectGrowth(TrimState below, TrimState above, TrimState out) {
    low.copyFrom(below);
    high.copyFrom(above);
    double excessLow = low.sigma - growthMax;
    double excessHigh = high.sigma - growthMax;
    int side = 0;
    for (int k = 0; k < 60; k++) {
      double width = Math.abs(high.meanSlip - low.meanSlip);
      if (width < 1e-10 || excessLow > -1e-7) {
        break;
      }
      double share = k % 3 == 2 ? 0.5 : excessLow / (excessLow - excessHigh);
      double meanSlip = low.meanSlip + share * (high.meanSlip - low.meanSlip);
      if (!solveAt(low, meanSlip, trial)) {
        break;
      }
      if (grows(trial)) {
        high.copyFrom(trial);
        excessHigh = trial.sigma - growthMax;
        excessLow *= side == -1 ? 0.5 : 1;
        side = -1;
      } else {
        low.copyFrom(trial);
        excessLow = trial.sigma - growthMax;
        excessHigh *= side == 1 ? 0.5 : 1;
        side = 1;
      }
    }
    out.copyFrom(low);
    return TrimLimit.DRIVER;
  }
}
