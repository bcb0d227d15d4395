package rampwright.vehicle.circuit.survey;

import rampwright.vehicle.circuit.Pose;

/**
 * The turn, shift and scale that lay one row of points on another with the least sum of squares.
 * With points as complex numbers the best turn and scale together are {@code a = sum(conj(z) w) /
 * sum(|z|²)} over the points less their means.
 */
final class ShapeFit {
  private final double scale;
  private final double angle;
  private final double shiftX;
  private final double shiftY;

  private ShapeFit(double scale, double angle, double shiftX, double shiftY) {
    this.scale = scale;
    this.angle = angle;
    this.shiftX = shiftX;
    this.shiftY = shiftY;
  }

  /**
   * Fits points to others.
   *
   * @param from points that are laid (m)
   * @param to points on which they are laid, as many (m)
   */
  static ShapeFit of(Curve from, Curve to) {
    int n = from.size();
    double fromX = 0;
    double fromY = 0;
    double toX = 0;
    double toY = 0;
    for (int i = 0; i < n; i++) {
      fromX += from.x(i) / n;
      fromY += from.y(i) / n;
      toX += to.x(i) / n;
      toY += to.y(i) / n;
    }
    double along = 0;
    double across = 0;
    double square = 0;
    for (int i = 0; i < n; i++) {
      double zx = from.x(i) - fromX;
      double zy = from.y(i) - fromY;
      double wx = to.x(i) - toX;
      double wy = to.y(i) - toY;
      along += zx * wx + zy * wy;
      across += zx * wy - zy * wx;
      square += zx * zx + zy * zy;
    }
    double angle = Math.atan2(across, along);
    double cos = Math.cos(angle);
    double sin = Math.sin(angle);
    return new ShapeFit(
        Math.hypot(along, across) / square,
        angle,
        toX - (cos * fromX - sin * fromY),
        toY - (sin * fromX + cos * fromY));
  }

  /** Returns the factor by which the laid points are too small. */
  double scale() {
    return scale;
  }

  /** Returns where the origin and the x axis of the laid points come to lie, at their own scale. */
  Pose frame() {
    return new Pose(shiftX, shiftY, angle);
  }
}
