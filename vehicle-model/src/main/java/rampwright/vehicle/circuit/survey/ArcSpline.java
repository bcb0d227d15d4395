package rampwright.vehicle.circuit.survey;

import org.apache.commons.math3.analysis.interpolation.SplineInterpolator;
import org.apache.commons.math3.analysis.polynomials.PolynomialSplineFunction;

/**
 * A plane curve through points: cubic splines of x and y over the sum of chords, with its direction
 * over its arc length. A closed one is continued round by 24 points at each end, after which the
 * free end of a cubic spline is felt by less than {@code (2 - sqrt(3))^24 = 2e-14} (de Boor, <i>A
 * Practical Guide to Splines</i>, 1978, ch. IV).
 */
final class ArcSpline {
  private static final int WRAP = 24;

  /** Steps of the arc length between two points; Simpson's rule over each. */
  private static final int STEPS = 16;

  private final double[] distance;
  private final Curve heading;

  private ArcSpline(double[] distance, Curve heading) {
    this.distance = distance;
    this.heading = heading;
  }

  /**
   * Returns the curve through points.
   *
   * @param closed whether the last point is the first one given again
   */
  static ArcSpline of(LinePoints points, boolean closed) {
    int n = points.size();
    int wrap = closed ? Math.min(WRAP, n - 1) : 0;
    double[] chords = points.chords();
    double[] t = new double[n + 2 * wrap];
    double[] x = new double[t.length];
    double[] y = new double[t.length];
    for (int k = 0; k < t.length; k++) {
      int i = Math.floorMod(k - wrap, n - 1);
      boolean last = k == t.length - 1 && !closed;
      LinePoints.Point point = points.get(last ? n - 1 : i);
      x[k] = point.x();
      y[k] = point.y();
      t[k] = k == 0 ? 0 : t[k - 1] + chords[Math.floorMod(k - 1 - wrap, n - 1)];
    }
    SplineInterpolator splines = new SplineInterpolator();
    return along(splines.interpolate(t, x), splines.interpolate(t, y), t, wrap, n);
  }

  private static ArcSpline along(
      PolynomialSplineFunction x, PolynomialSplineFunction y, double[] t, int wrap, int n) {
    PolynomialSplineFunction dx = x.polynomialSplineDerivative();
    PolynomialSplineFunction dy = y.polynomialSplineDerivative();
    double[] distance = new double[n];
    double[] s = new double[(n - 1) * STEPS + 1];
    double[] angle = new double[s.length];
    angle[0] = Math.atan2(dy.value(t[wrap]), dx.value(t[wrap]));
    for (int i = 0; i < n - 1; i++) {
      double from = t[wrap + i];
      double step = (t[wrap + i + 1] - from) / STEPS;
      for (int k = 0; k < STEPS; k++) {
        int at = i * STEPS + k;
        double a = from + k * step;
        double b = k + 1 < STEPS ? a + step : t[wrap + i + 1];
        s[at + 1] =
            s[at]
                + (b - a)
                    / 6
                    * (speed(dx, dy, a) + 4 * speed(dx, dy, (a + b) / 2) + speed(dx, dy, b));
        double direction = Math.atan2(dy.value(b), dx.value(b));
        angle[at + 1] = angle[at] + Math.IEEEremainder(direction - angle[at], 2 * Math.PI);
      }
      distance[i + 1] = s[(i + 1) * STEPS];
    }
    return new ArcSpline(distance, Curve.of(s, angle));
  }

  private static double speed(PolynomialSplineFunction dx, PolynomialSplineFunction dy, double t) {
    return Math.hypot(dx.value(t), dy.value(t));
  }

  /** Returns the arc length of the whole curve (m). */
  double length() {
    return distance[distance.length - 1];
  }

  /** Returns the arc length at a point (m). */
  double distance(int point) {
    return distance[point];
  }

  /** Returns the direction (rad, not wrapped) over the arc length (m). */
  Curve heading() {
    return heading;
  }
}
