package rampwright.vehicle.balance;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import rampwright.vehicle.circuit.Road;

/**
 * The corners of a road, found from its curvature alone: every car and every setting has the same
 * ones.
 *
 * <p>A corner is a stretch that bends to one side with a curvature of at least {@link #LEAVE}, that
 * reaches {@link #ENTER} somewhere and turns by at least {@link #LEAST_TURNING}. The two thresholds
 * are a hysteresis: noise of the curvature between them neither opens a corner nor cuts one in two.
 * The values are ours.
 *
 * @param list the corners in driving order
 */
public record Corners(List<Corner> list) {
  /** Curvature (1/m) that makes a bend a corner: a radius of 333 m. */
  public static final double ENTER = 0.003;

  /** Curvature (1/m) at which a corner begins and ends: a radius of 667 m. */
  public static final double LEAVE = 0.0015;

  /** Change of heading (rad) that a corner has at least. */
  public static final double LEAST_TURNING = Math.toRadians(8);

  /** Copies the list. */
  public Corners {
    list = List.copyOf(list);
  }

  /** Finds the corners of a road. */
  public static Corners of(Road road) {
    int n = road.size();
    int origin = road.closed() ? straightest(road) : 0;
    List<Corner> found = new ArrayList<>();
    int k = 0;
    while (k < n) {
      int side = side(road, (origin + k) % n);
      int end = k + 1;
      while (end < n && side(road, (origin + end) % n) == side) {
        end++;
      }
      if (side != 0) {
        add(road, (origin + k) % n, end - k, side > 0, found);
      }
      k = end;
    }
    found.sort(Comparator.comparingInt(Corner::first));
    List<Corner> numbered = new ArrayList<>();
    for (Corner c : found) {
      int number = numbered.size() + 1;
      numbered.add(new Corner(number, c.left(), c.first(), c.count(), c.tightest(), c.turning()));
    }
    return new Corners(numbered);
  }

  private static int side(Road road, int i) {
    double curvature = road.curvature(i);
    return Math.abs(curvature) < LEAVE ? 0 : curvature > 0 ? 1 : -1;
  }

  private static int straightest(Road road) {
    int straightest = 0;
    for (int i = 1; i < road.size(); i++) {
      if (Math.abs(road.curvature(i)) < Math.abs(road.curvature(straightest))) {
        straightest = i;
      }
    }
    return straightest;
  }

  private static void add(Road road, int first, int count, boolean left, List<Corner> to) {
    double turning = 0;
    int tightest = first;
    for (int k = 0; k < count; k++) {
      int i = (first + k) % road.size();
      turning += Math.abs(road.curvature(i)) * road.spacing();
      if (Math.abs(road.curvature(i)) > Math.abs(road.curvature(tightest))) {
        tightest = i;
      }
    }
    if (Math.abs(road.curvature(tightest)) >= ENTER && turning >= LEAST_TURNING) {
      to.add(new Corner(0, left, first, count, tightest, turning));
    }
  }
}
