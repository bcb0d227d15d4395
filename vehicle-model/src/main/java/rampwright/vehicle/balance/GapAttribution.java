package rampwright.vehicle.balance;

import java.util.ArrayList;
import java.util.List;
import rampwright.vehicle.Car;
import rampwright.vehicle.balance.GapSplit.Cause;
import rampwright.vehicle.balance.GapSplit.Part;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapLimit;

/** Follows the energy difference of two laps to its causes, by the rules of {@link GapSplit}. */
final class GapAttribution {
  private static final int CAUSES = Cause.values().length;

  private final Lap reference;
  private final Lap other;
  private final LapPower referencePower;
  private final LapPower otherPower;
  private final int n;
  private final boolean closed;
  private final double ds;
  private final int[] corner;
  private final int rows;

  /** Energy difference by corner and cause, carried from station to station (m²/s²). */
  private double[] carried;

  private final double[] seconds;

  GapAttribution(Lap reference, Lap other) {
    this.reference = reference;
    this.other = other;
    this.referencePower = new LapPower(reference);
    this.otherPower = new LapPower(other);
    this.n = reference.road().size();
    this.closed = reference.road().closed();
    this.ds = reference.road().spacing();
    Corners corners = Corners.of(reference.road());
    this.rows = corners.list().size() + 1;
    this.corner = new int[n];
    for (Stretch stretch : LapPhases.of(reference, corners)) {
      for (int k = 0; k < stretch.count(); k++) {
        int number = stretch.corner() == null ? 0 : stretch.corner().number();
        corner[(stretch.first() + k) % n] = number;
      }
    }
    this.carried = new double[rows * CAUSES];
    this.seconds = new double[rows * CAUSES];
    walk();
  }

  List<Part> parts() {
    List<Part> parts = new ArrayList<>();
    for (int row = 0; row < rows; row++) {
      for (Cause cause : Cause.values()) {
        double part = seconds[slot(row, cause)];
        if (part != 0) {
          parts.add(new Part(row, cause, part));
        }
      }
    }
    return parts;
  }

  // Stations are counted on beyond the start line; at() folds them back.

  private void walk() {
    int origin = closed ? anchor() : 0;
    int end = origin + (closed ? n : n - 1);
    boolean anchored = !closed || isAnchor(origin);
    restart(origin, anchored ? Cause.CORNERING_SPEED : Cause.OTHER);
    int i = origin;
    while (i < end) {
      if (bothBrake(i)) {
        int after = i;
        while (after < end && bothBrake(after)) {
          after++;
        }
        backFrom(after, i);
        restart(after, Cause.CORNERING_SPEED);
        i = after;
      } else {
        if (bothCorner(i)) {
          restart(i, Cause.CORNERING_SPEED);
        }
        forward(i);
        i++;
      }
    }
  }

  /** First station from which the walk can start without a past; the slowest when there is none. */
  private int anchor() {
    int slowest = 0;
    for (int i = 0; i < n; i++) {
      if (isAnchor(i)) {
        return i;
      }
      if (speed(reference, i) < speed(reference, slowest)) {
        slowest = i;
      }
    }
    return slowest;
  }

  private boolean isAnchor(int i) {
    return bothCorner(i) || bothBrake(i - 1) && !bothBrake(i);
  }

  private void restart(int i, Cause cause) {
    carried = new double[rows * CAUSES];
    carried[slot(corner[at(i)], cause)] = energy(i);
  }

  /** Braking of both laps from a station up to the one after it, seen backward. */
  private void backFrom(int after, int first) {
    restart(after, Cause.CORNERING_SPEED);
    int braking = slot(corner[at(after)], Cause.BRAKING);
    for (int i = after - 1; i >= first; i--) {
      double[] ahead = carried.clone();
      carried[braking] += energy(i) - energy(i + 1);
      book(i, ahead, carried, braking);
    }
  }

  private void forward(int i) {
    double[] before = carried.clone();
    double change = energy(i + 1) - energy(i);
    Cause cause = cause(i);
    int row = cause == Cause.BRAKING ? cornerAhead(i) : corner[at(i)];
    if (cause == Cause.OTHER) {
      double decay = decay(i);
      for (int k = 0; k < carried.length; k++) {
        carried[k] *= 1 - decay;
      }
      change += decay * energy(i);
    }
    carried[slot(row, cause)] += change;
    book(i, before, carried, slot(row, cause));
  }

  /** Shares out the time of an interval by the mean energy differences, the rest to its cause. */
  private void book(int i, double[] from, double[] to, int own) {
    double slow = meanSpeed(reference, i);
    double fast = meanSpeed(other, i);
    double perEnergy = -2 * ds / (slow * fast * (slow + fast));
    double left = otherPower.interval(at(i)) - referencePower.interval(at(i));
    for (int k = 0; k < from.length; k++) {
      double part = perEnergy * (from[k] + to[k]) / 2;
      seconds[k] += part;
      left -= part;
    }
    seconds[own] += left;
  }

  private Cause cause(int i) {
    LapLimit a = reference.limit(at(i));
    LapLimit b = other.limit(at(i));
    if (brakes(a) || brakes(b)) {
      return Cause.BRAKING;
    }
    if (a == LapLimit.SHIFT || b == LapLimit.SHIFT || gear(reference, i) != gear(other, i)) {
      return Cause.GEAR_CHANGES;
    }
    if (a == LapLimit.CORNERING || b == LapLimit.CORNERING) {
      return Cause.CORNERING_SPEED;
    }
    return a == LapLimit.POWER && b == LapLimit.POWER ? Cause.OTHER : Cause.TRACTION;
  }

  /** Corner for which the next braking of both laps is done. */
  private int cornerAhead(int i) {
    int last = closed ? i + n : n - 1;
    boolean seen = false;
    for (int k = i; k <= last; k++) {
      if (seen && !bothBrake(k)) {
        return corner[at(k)];
      }
      seen |= bothBrake(k);
    }
    return corner[at(i)];
  }

  /**
   * Share of an energy difference that is lost over an interval at full power in the same gear:
   * {@code -d(ax)/d(v²/2) ds} of {@code m ax = T_full(v/R)/R - rho/2 cdA v²}.
   */
  private double decay(int i) {
    Car car = reference.request().car();
    double radius =
        car.driveline().layout() == DriveLayout.FRONT ? car.frontRadius() : car.rearRadius();
    double mass = car.chassis().mass() + reference.request().conditions().fuelMass();
    double v = (speed(reference, i) + speed(other, i)) / 2;
    double slope = car.driveline().fullTorqueSlope(gear(reference, i), v / radius);
    double drag = reference.request().conditions().airDensity() * car.aero().dragArea();
    return ds / mass * (drag - slope / (radius * radius * v));
  }

  private static boolean brakes(LapLimit limit) {
    return limit == LapLimit.BRAKING || limit == LapLimit.SLIDE_ON_BRAKES;
  }

  private boolean bothBrake(int i) {
    return brakes(reference.limit(at(i))) && brakes(other.limit(at(i)));
  }

  private boolean bothCorner(int i) {
    return reference.limit(at(i)) == LapLimit.CORNERING && other.limit(at(i)) == LapLimit.CORNERING;
  }

  private int gear(Lap lap, int i) {
    return (int) lap.trace().get(Channel.GEAR, at(i));
  }

  private double energy(int i) {
    double a = speed(reference, i);
    double b = speed(other, i);
    return (b - a) * (b + a) / 2;
  }

  private double meanSpeed(Lap lap, int i) {
    double from = speed(lap, i);
    double to = speed(lap, i + 1);
    return Math.sqrt((from * from + to * to) / 2);
  }

  private double speed(Lap lap, int i) {
    return lap.trace().get(Channel.SPEED, at(i));
  }

  private int at(int i) {
    return Math.floorMod(i, n);
  }

  private static int slot(int row, Cause cause) {
    return row * CAUSES + cause.ordinal();
  }
}
