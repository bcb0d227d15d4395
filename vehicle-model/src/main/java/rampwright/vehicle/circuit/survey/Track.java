package rampwright.vehicle.circuit.survey;

import java.util.Optional;

/**
 * A driven or surveyed line before it becomes a circuit.
 *
 * @param heading direction (rad, not wrapped) over distance (m) from 0
 * @param length of the lap or run (m)
 * @param offset what an offset of the sensor behind the direction does
 * @param speed logged speed (m/s) over distance (m)
 * @param fixes measured positions
 * @param elevation height (m) over distance (m)
 */
record Track(
    Curve heading,
    double length,
    Offset offset,
    Optional<Curve> speed,
    Optional<Fixes> fixes,
    Optional<Curve> elevation) {

  /** Over this distance (m) noise of the direction hardly adds to its changes. */
  private static final double STEP = 10;

  /** A sensor whose zero may be off. */
  enum Offset {
    NONE,
    /** Curvature is lateral acceleration over speed squared. */
    LATERAL_ACCELERATION,
    /** Curvature is yaw rate over speed. */
    YAW_RATE
  }

  /**
   * Positions in the plane, with the distance at which each was taken.
   *
   * @param east x (m) over distance (m)
   * @param north y (m) over distance (m)
   */
  record Fixes(Curve east, Curve north) {
    int size() {
      return east.size();
    }

    double distance(int i) {
      return east.x(i);
    }

    /** Returns the distance between the last position and the first (m). */
    double gap() {
      int last = size() - 1;
      return Math.hypot(east.y(0) - east.y(last), north.y(0) - north.y(last));
    }

    /** Returns the area inside the positions (m²), positive where they go round to the left. */
    double area() {
      double area = 0;
      for (int i = 0; i < size(); i++) {
        int k = (i + 1) % size();
        area += 0.5 * (east.y(i) * north.y(k) - east.y(k) * north.y(i));
      }
      return area;
    }

    Curve points() {
      double[] x = new double[size()];
      double[] y = new double[size()];
      for (int i = 0; i < x.length; i++) {
        x[i] = east.y(i);
        y[i] = north.y(i);
      }
      return Curve.of(x, y);
    }
  }

  /**
   * Returns the track with every distance multiplied. Where the direction comes from lateral
   * acceleration over speed, it is divided by the same factor.
   */
  Track scaled(double factor) {
    double turning = offset == Offset.LATERAL_ACCELERATION ? 1 / factor : 1;
    return new Track(
        heading.scaled(factor, turning),
        length * factor,
        offset,
        speed.map(curve -> curve.scaled(factor, 1)),
        fixes.map(f -> new Fixes(f.east.scaled(factor, 1), f.north.scaled(factor, 1))),
        elevation.map(curve -> curve.scaled(factor, 1)));
  }

  /** Returns the whole turning (rad). */
  double turning() {
    return heading.at(length) - heading.at(0);
  }

  /** Returns the turns to the left and to the right, both counted positive (rad). */
  double absoluteTurning() {
    double sum = 0;
    for (double at = STEP; at <= length; at += STEP) {
      sum += Math.abs(heading.at(at) - heading.at(at - STEP));
    }
    return sum;
  }

  /**
   * Returns the direction at a distance; a closed line goes on round.
   *
   * @param closed whether the end joins the start
   */
  double heading(double at, boolean closed) {
    return closed && at < 0 ? heading.at(at + length) - turning() : heading.at(at);
  }
}
