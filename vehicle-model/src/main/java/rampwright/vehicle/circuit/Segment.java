package rampwright.vehicle.circuit;

import java.util.Locale;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/** One piece of a line as a plan gives it. */
public sealed interface Segment {
  Quantity LENGTH = Quantity.si("length_m", "length of a straight", "m", 0, 1e5, "");
  Quantity RADIUS = Quantity.si("radius_m", "corner radius", "m", 2, 1e5, "");
  Quantity ANGLE = Quantity.degrees("angle_deg", "corner angle", -720, 720, "");
  Quantity TRANSITION = Quantity.si("transition_m", "length of a transition", "m", 0, 1e4, "");

  /** Returns the length along the line (m). */
  double length();

  /** Returns the change of direction (rad), positive to the left. */
  double turning();

  /**
   * A straight.
   *
   * @param length length (m)
   */
  record Straight(double length) implements Segment {
    /** Checks the length. */
    public Straight {
      LENGTH.check(length);
    }

    @Override
    public double turning() {
      return 0;
    }
  }

  /**
   * A corner: an arc between two transitions of equal length, over which the curvature rises and
   * falls as {@code 3u² - 2u³}, so that the curvature has no kink.
   *
   * @param radius radius of the arc (m)
   * @param angle whole change of direction (rad), positive to the left
   * @param transition length of each transition (m)
   */
  record Corner(double radius, double angle, double transition) implements Segment {
    /** Checks the values and that the transitions leave room for the arc. */
    public Corner {
      RADIUS.check(radius);
      ANGLE.check(angle);
      TRANSITION.check(transition);
      double longest = radius * Math.abs(angle);
      if (!(transition <= longest * (1 + 1e-12))) {
        throw InvalidInput.value(
            TRANSITION.label(),
            transition,
            "m",
            "at most radius times angle, here " + String.format(Locale.ROOT, "%.3f m", longest),
            "the corner needs a larger radius");
      }
    }

    /** Returns a corner with its angle in degrees. */
    public static Corner degrees(double radius, double angle, double transition) {
      return new Corner(radius, Math.toRadians(angle), transition);
    }

    /** Returns the curvature of the arc (1/m). */
    public double curvature() {
      return Math.signum(angle) / radius;
    }

    @Override
    public double length() {
      return radius * Math.abs(angle) + transition;
    }

    @Override
    public double turning() {
      return angle;
    }

    /** Returns the curvature (1/m) at a distance (m) from the start of the corner. */
    double curvature(double s) {
      double edge = Math.min(s, length() - s);
      if (edge >= transition) {
        return curvature();
      }
      double u = Math.max(edge, 0) / transition;
      return curvature() * u * u * (3 - 2 * u);
    }
  }
}
