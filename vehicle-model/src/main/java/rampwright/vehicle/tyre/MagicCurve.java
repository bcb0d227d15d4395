package rampwright.vehicle.tyre;

/**
 * The Magic Formula's curve over one kind of slip,
 *
 * <pre>
 *   y = D sin(C atan(w))     w = u - E (u - atan u)     u = B x
 * </pre>
 *
 * and its cosine form, which weighs a force down as the other kind of slip grows. Stiffness at zero
 * slip is {@code B C D}; the peak is {@code D} when {@code C} is above 1. Source: Bakker, Nyborg
 * and Pacejka, <i>Tyre modelling for use in vehicle dynamics studies</i>, SAE 870421, 1987;
 * Pacejka, <i>Tire and Vehicle Dynamics</i>, 3rd ed. 2012, section 4.3.
 */
final class MagicCurve {
  private static final int MOST_ITERATIONS = 60;

  private MagicCurve() {}

  /** Returns {@code w} for {@code u} and the curvature factor {@code e}. */
  static double argument(double u, double e) {
    return u - e * (u - Math.atan(u));
  }

  /** Returns the derivative of {@link #argument} with {@code u}. */
  static double argumentSlope(double u, double e) {
    double square = u * u;
    return 1 - e * square / (1 + square);
  }

  /** Returns the derivative of {@link #argument} with {@code e}. */
  static double argumentByCurvature(double u) {
    return Math.atan(u) - u;
  }

  /** Returns {@code d sin(c atan(w))} for a slip {@code x}. */
  static double value(double b, double c, double d, double e, double x) {
    return d * Math.sin(c * Math.atan(argument(b * x, e)));
  }

  /** Returns {@code cos(c atan w)}, by which another force is weighed down. */
  static double weight(double u, double c, double e) {
    return Math.cos(c * Math.atan(argument(u, e)));
  }

  /** Returns the derivative of {@link #weight} with {@code u}. */
  static double weightByU(double u, double c, double e) {
    return weightByArgument(u, c, e) * argumentSlope(u, e);
  }

  /** Returns the derivative of {@link #weight} with {@code e}. */
  static double weightByCurvature(double u, double c, double e) {
    return weightByArgument(u, c, e) * argumentByCurvature(u);
  }

  private static double weightByArgument(double u, double c, double e) {
    double w = argument(u, e);
    return -c * Math.sin(c * Math.atan(w)) / (1 + w * w);
  }

  /**
   * Returns the {@code u} (not negative) at which the curve peaks.
   *
   * @param c shape factor
   * @param e curvature factor, at most 1
   * @param largest what to return when the curve peaks beyond it or not at all
   */
  static double peak(double c, double e, double largest) {
    if (c <= 1) {
      return largest;
    }
    double wanted = Math.tan(Math.PI / (2 * c));
    if (argument(largest, e) < wanted) {
      return largest;
    }
    double low = 0;
    double high = largest;
    double u = Math.min(wanted, largest);
    for (int i = 0; i < MOST_ITERATIONS; i++) {
      double miss = argument(u, e) - wanted;
      if (miss > 0) {
        high = u;
      } else {
        low = u;
      }
      double newton = u - miss / argumentSlope(u, e);
      double next = newton > low && newton < high ? newton : (low + high) / 2;
      if (Math.abs(next - u) <= 1e-14 * Math.max(1, u)) {
        return next;
      }
      u = next;
    }
    return u;
  }
}
