package rampwright.vehicle.driveline;

import java.util.List;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * Engine torque over engine speed, linear between its points and constant beyond them.
 *
 * @param points at least two points with rising speed
 */
public record TorqueCurve(List<Point> points) {
  /**
   * One point of the curve.
   *
   * @param speed engine speed (rad/s), not negative
   * @param torque crankshaft torque (N·m), negative on overrun
   */
  public record Point(double speed, double torque) {
    public static final Quantity SPEED =
        new Quantity("rpm", "engine speed of a torque point", "rpm", Math.PI / 30, 0, 40000, "");
    public static final Quantity TORQUE =
        Quantity.si("nm", "engine torque", "N·m", -20000, 20000, "");

    /** Checks both values. */
    public Point {
      SPEED.check(speed);
      TORQUE.check(torque);
    }
  }

  /** Rejects fewer than two points and speeds that do not rise. */
  public TorqueCurve {
    points = List.copyOf(points);
    if (points.size() < 2) {
      throw InvalidInput.of("torque curve", points.size() + " points", "at least 2 points", "");
    }
    for (int i = 1; i < points.size(); i++) {
      if (points.get(i).speed() <= points.get(i - 1).speed()) {
        throw InvalidInput.value(
            "engine speed of torque point " + (i + 1),
            points.get(i).speed() / Point.SPEED.siPerUnit(),
            Point.SPEED.unit(),
            "above that of the point before it",
            "sort the points by speed");
      }
    }
  }

  /** Returns the torque (N·m) at an engine speed (rad/s). */
  public double torque(double speed) {
    int i = segment(speed);
    if (i < 0) {
      return points.get(0).torque();
    }
    if (i >= points.size() - 1) {
      return points.get(points.size() - 1).torque();
    }
    return points.get(i).torque() + slope(i) * (speed - points.get(i).speed());
  }

  /** Returns the slope of the torque (N·m·s/rad) at an engine speed; zero beyond the ends. */
  public double slope(double speed) {
    int i = segment(speed);
    return i < 0 || i >= points.size() - 1 ? 0 : slope(i);
  }

  private double slope(int i) {
    Point p = points.get(i);
    Point q = points.get(i + 1);
    return (q.torque() - p.torque()) / (q.speed() - p.speed());
  }

  private int segment(double speed) {
    int i = -1;
    while (i + 1 < points.size() && points.get(i + 1).speed() <= speed) {
      i++;
    }
    return i;
  }
}
