package rampwright.vehicle.balance;

import java.util.ArrayList;
import java.util.List;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapLimit;

/**
 * Divides a lap into the phases of its corners; every station is in exactly one.
 *
 * <p>A corner lasts from where the car starts to slow down for it (its own bend at the latest) to
 * where it starts to slow down for the next. Its slowest station parts entry from exit. Full power
 * counts as reached when it is held for {@link #HELD} metres and not given up again within the
 * bend. A corner that is driven at full power throughout is all {@link Phase#STRAIGHT}. What comes
 * before the first corner of an open run is a {@link Phase#STRAIGHT} of that corner.
 */
final class LapPhases {
  /** Distance (m) over which full power must be held. */
  static final double HELD = 10;

  /** The apex reaches as far as the speed is below this multiple of the slowest. */
  private static final double APEX_SPEED = 1.02;

  private final Lap lap;
  private final int n;
  private final boolean closed;
  private final List<Corner> corners;
  private final List<Stretch> stretches = new ArrayList<>();
  private final List<Integer> slowest = new ArrayList<>();

  private LapPhases(Lap lap, Corners corners) {
    this.lap = lap;
    this.n = lap.road().size();
    this.closed = lap.road().closed();
    this.corners = corners.list();
  }

  /** Returns the stretches in driving order, from the start of the first corner. */
  static List<Stretch> of(Lap lap, Corners corners) {
    LapPhases phases = new LapPhases(lap, corners);
    if (corners.list().isEmpty()) {
      return List.of(new Stretch(null, Phase.STRAIGHT, 0, phases.n));
    }
    phases.divide();
    return List.copyOf(phases.stretches);
  }

  // Stations are counted on without returning to 0 at the start line; at() folds them back.

  private void divide() {
    for (Corner corner : corners) {
      slowest.add(slowest(corner));
    }
    int count = corners.size();
    int[] start = new int[count + 1];
    for (int k = 0; k < count; k++) {
      int before = k > 0 ? slowest.get(k - 1) : closed ? slowest.get(count - 1) - n : -1;
      start[k] = start(corners.get(k), before, slowest.get(k));
    }
    start[count] = closed ? start[0] + n : n;
    if (!closed) {
      add(corners.get(0), Phase.STRAIGHT, 0, start[0]);
    }
    for (int k = 0; k < count; k++) {
      corner(corners.get(k), start[k], slowest.get(k), start[k + 1]);
    }
  }

  private int slowest(Corner corner) {
    int slowest = corner.first();
    for (int i = corner.first(); i < corner.first() + corner.count(); i++) {
      if (speed(i) < speed(slowest)) {
        slowest = i;
      }
    }
    return slowest;
  }

  /** First station at which the car slows down for a corner. */
  private int start(Corner corner, int slowestBefore, int slowestHere) {
    int fastest = slowestBefore + 1;
    for (int i = fastest; i <= slowestHere; i++) {
      if (speed(i) >= speed(fastest)) {
        fastest = i;
      }
    }
    int bend = corner.first();
    for (int i = fastest; i < bend; i++) {
      if (!driving(i)) {
        return i;
      }
    }
    return bend;
  }

  private void corner(Corner corner, int start, int slowest, int next) {
    int bendEnd = Math.min(next, corner.first() + corner.count());
    if (atFullPower(start, bendEnd)) {
      add(corner, Phase.STRAIGHT, start, next);
      return;
    }
    int apex = slowest;
    while (apex > start && aroundApex(apex - 1, slowest)) {
      apex--;
    }
    int exit = slowest + 1;
    while (exit < next && aroundApex(exit, slowest)) {
      exit++;
    }
    int entry = start;
    for (int i = start; i < Math.min(apex, corner.first()); i++) {
      entry = braked(i) ? i + 1 : entry;
    }
    int full = fullPower(exit, bendEnd, next);
    add(corner, Phase.BRAKING, start, entry);
    add(corner, Phase.ENTRY, entry, apex);
    add(corner, Phase.APEX, apex, exit);
    add(corner, Phase.EXIT, exit, full);
    add(corner, Phase.STRAIGHT, full, next);
  }

  private boolean aroundApex(int i, int slowest) {
    return limit(i) == LapLimit.CORNERING && speed(i) <= APEX_SPEED * speed(slowest);
  }

  /** First station from which full power is held, or the end when there is none. */
  private int fullPower(int from, int bendEnd, int end) {
    int first = from;
    for (int i = from; i < bendEnd; i++) {
      first = full(i) ? first : i + 1;
    }
    int stations = (int) Math.ceil(HELD / lap.road().spacing());
    for (int i = first; i < end; i++) {
      if (atFullPower(i, Math.min(end, i + stations))) {
        return i;
      }
    }
    return end;
  }

  private boolean atFullPower(int from, int end) {
    for (int i = from; i < end; i++) {
      if (!full(i)) {
        return false;
      }
    }
    return true;
  }

  private void add(Corner corner, Phase phase, int from, int end) {
    if (end > from) {
      stretches.add(new Stretch(corner, phase, at(from), end - from));
    }
  }

  /** Nothing but the engine, or a gear change, limits the car. */
  private boolean full(int i) {
    return limit(i) == LapLimit.POWER || limit(i) == LapLimit.SHIFT;
  }

  /** The car accelerates as much as it can. */
  private boolean driving(int i) {
    return full(i) || limit(i) == LapLimit.TRACTION || limit(i) == LapLimit.SLIDE_ON_POWER;
  }

  private boolean braked(int i) {
    return lap.trace().get(Channel.BRAKE_TORQUE, at(i)) > 0;
  }

  private LapLimit limit(int i) {
    return lap.limit(at(i));
  }

  private double speed(int i) {
    return lap.trace().get(Channel.SPEED, at(i));
  }

  private int at(int i) {
    return closed ? Math.floorMod(i, n) : i;
  }
}
