package rampwright.vehicle.balance;

import java.util.ArrayList;
import java.util.List;
import rampwright.vehicle.input.Quantity;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.trim.TrimSolver;
import rampwright.vehicle.trim.TrimState;

/**
 * Stability and balance at a share of the limit: what the driver meets who does not use all of it.
 *
 * <p>For each corner and each of its phases except the straight, the station with the largest slide
 * growth rate is taken, and the trim is solved there with that share of both accelerations: along
 * the path and, by a lower speed, across it.
 */
public final class NearLimits {
  /** The share that is usually looked at (-). */
  public static final double USUAL_SHARE = 0.95;

  public static final Quantity SHARE =
      Quantity.si("limit_share", "share of the limit", "", 0.05, 1, "it was given in percent");

  private final Lap lap;
  private final double share;
  private final TrimSolver solver;
  private final TrimState level = new TrimState();
  private final TrimState found = new TrimState();

  private NearLimits(Lap lap, double share) {
    this.lap = lap;
    this.share = SHARE.check(share);
    this.solver =
        new TrimSolver(
            lap.request().car(), lap.request().conditions(), lap.request().differentials());
  }

  /** Returns the critical points of a lap in driving order. */
  public static List<NearLimit> of(Lap lap, double share) {
    NearLimits limits = new NearLimits(lap, share);
    List<NearLimit> points = new ArrayList<>();
    for (Stretch stretch : LapPhases.of(lap, Corners.of(lap.road()))) {
      if (stretch.phase() != Phase.STRAIGHT) {
        points.add(limits.point(stretch));
      }
    }
    return List.copyOf(points);
  }

  private NearLimit point(Stretch stretch) {
    int i = critical(stretch);
    boolean left = stretch.corner().left();
    boolean solved = solve(i);
    return new NearLimit(
        stretch.corner().number(),
        stretch.phase(),
        i * lap.road().spacing(),
        share,
        get(Channel.SIGMA, i),
        solved ? found.sigma : Double.NaN,
        understeer(get(Channel.STEER, i), i, left),
        solved ? understeer(found.steer, i, left) : Double.NaN);
  }

  private int critical(Stretch stretch) {
    int critical = stretch.first();
    for (int k = 0; k < stretch.count(); k++) {
      int i = (stretch.first() + k) % lap.road().size();
      if (get(Channel.SIGMA, i) > get(Channel.SIGMA, critical)) {
        critical = i;
      }
    }
    return critical;
  }

  /** Solves the trim below the limit of a station; leaves it in {@code found}. */
  private boolean solve(int i) {
    solver.place(lap.road(), i);
    if (!solver.constantSpeed(get(Channel.SPEED, i) * Math.sqrt(share), level)) {
      return false;
    }
    int gear = (int) get(Channel.GEAR, i);
    return solver.atAcceleration(level, share * get(Channel.AX, i), gear, found)
        && solver.restore(found);
  }

  private double understeer(double steer, int i, boolean left) {
    double kinematic = lap.request().car().chassis().wheelbase() * get(Channel.CURVATURE, i);
    return left ? steer - kinematic : kinematic - steer;
  }

  private double get(Channel channel, int i) {
    return lap.trace().get(channel, i);
  }
}
