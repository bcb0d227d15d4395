package rampwright.vehicle.circuit;

/**
 * A place on a line.
 *
 * @param x position (m)
 * @param y position (m)
 * @param heading direction of travel (rad), anticlockwise from the x axis
 */
public record Pose(double x, double y, double heading) {
  /** The origin, along the x axis. */
  public static final Pose ORIGIN = new Pose(0, 0, 0);

  /**
   * Returns the pose after a stretch whose curvature changes linearly: the direction exactly, the
   * position by Simpson's rule.
   *
   * @param distance length of the stretch (m)
   * @param from curvature at its start (1/m)
   * @param to curvature at its end (1/m)
   */
  public Pose after(double distance, double from, double to) {
    double middle = heading + distance * (3 * from + to) / 8;
    double end = heading + distance * (from + to) / 2;
    return new Pose(
        x + distance / 6 * (Math.cos(heading) + 4 * Math.cos(middle) + Math.cos(end)),
        y + distance / 6 * (Math.sin(heading) + 4 * Math.sin(middle) + Math.sin(end)),
        end);
  }

  /** Returns the pose in whose axes this one was given, seen from the axes of {@code frame}. */
  public Pose in(Pose frame) {
    double cos = Math.cos(frame.heading);
    double sin = Math.sin(frame.heading);
    return new Pose(
        frame.x + cos * x - sin * y, frame.y + sin * x + cos * y, frame.heading + heading);
  }
}
