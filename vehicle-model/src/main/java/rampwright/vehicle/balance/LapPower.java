package rampwright.vehicle.balance;

import java.util.function.IntToDoubleFunction;
import rampwright.vehicle.Car;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.Trace;

/** Power (W) that is turned into heat, station by station, and its energy (J) over intervals. */
final class LapPower {
  /** Outputs that differ by less than this (rad/s) turn together within the solver's tolerance. */
  private static final double SAME_SPEED = 1e-4;

  /** Change of acceleration between stations (m/s²) that one limit alone does not explain. */
  private static final double JUMP = 2;

  private final Lap lap;
  private final Trace trace;
  private final boolean closed;
  private final int n;

  LapPower(Lap lap) {
    this.lap = lap;
    this.trace = lap.trace();
    this.closed = lap.road().closed();
    this.n = lap.road().size();
  }

  /** Time (s) from a station to the next; 0 at the end of an open road. */
  double interval(int i) {
    if (i < n - 1) {
      return trace.get(Channel.TIME, i + 1) - trace.get(Channel.TIME, i);
    }
    return closed ? lap.time() - trace.get(Channel.TIME, i) : 0;
  }

  /**
   * Energy (J) of a power from a station to the next: by the trapezoidal rule, or, where the
   * acceleration jumps, with either station's power for as long as the speed gained says.
   */
  double energy(int i, IntToDoubleFunction power) {
    int next = i < n - 1 ? i + 1 : closed ? 0 : i;
    double share = shareOfFirst(i, next);
    return interval(i) * (share * power.applyAsDouble(i) + (1 - share) * power.applyAsDouble(next));
  }

  private double shareOfFirst(int i, int next) {
    double from = trace.get(Channel.AX, i);
    double to = trace.get(Channel.AX, next);
    if (Math.abs(from - to) < JUMP) {
      return 0.5;
    }
    double start = trace.get(Channel.SPEED, i);
    double end = trace.get(Channel.SPEED, next);
    double mean = (end * end - start * start) / (2 * lap.road().spacing());
    return Math.max(0, Math.min(1, (mean - to) / (from - to)));
  }

  /** Energy (J) of a power over the whole lap. */
  double lapEnergy(IntToDoubleFunction power) {
    double sum = 0;
    for (int i = 0; i < n; i++) {
      sum += energy(i, power);
    }
    return sum;
  }

  /** Sliding power of all differentials. */
  double plates(int i) {
    return plates(i, UnitPosition.FRONT)
        + plates(i, UnitPosition.CENTRE)
        + plates(i, UnitPosition.REAR);
  }

  /** Sliding power of one differential: {@code D |dOmega| / 2}. */
  double plates(int i, UnitPosition unit) {
    return trace.get(unit.torqueDifference(), i)
        * Math.abs(trace.get(unit.speedDifference(), i))
        / 2;
  }

  /** Sliding power of both front tyres. */
  double frontTyres(int i) {
    double radius = car().frontRadius();
    return tyre(i, 0, radius) + tyre(i, 1, radius);
  }

  /** Sliding power of both rear tyres. */
  double rearTyres(int i) {
    double radius = car().rearRadius();
    return tyre(i, 2, radius) + tyre(i, 3, radius);
  }

  /** Returns whether the outputs of a unit with friction turn together. */
  boolean sticking(int i, Channel capacity, Channel speedDifference) {
    return trace.get(capacity, i) > 0 && Math.abs(trace.get(speedDifference, i)) < SAME_SPEED;
  }

  /**
   * Sliding power of a tyre, {@code Fx (omega R - vx) - Fy vy}: its force times the velocity with
   * which its contact slides over the road.
   */
  private double tyre(int i, int wheel, double radius) {
    double slip = block(Channel.SLIP_FL, wheel, i);
    double rolling = block(Channel.WHEEL_SPEED_FL, wheel, i) * radius / (1 + slip);
    double across = rolling * Math.tan(block(Channel.SLIP_ANGLE_FL, wheel, i));
    return block(Channel.FX_FL, wheel, i) * rolling * slip
        - block(Channel.FY_FL, wheel, i) * across;
  }

  private double block(Channel first, int wheel, int i) {
    return trace.get(Channel.values()[first.ordinal() + wheel], i);
  }

  private Car car() {
    return lap.request().car();
  }
}
