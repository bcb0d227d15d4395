package rampwright.vehicle.differential.preload;

import java.util.Locale;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * A disc spring without flats, loaded on its edges.
 *
 * <p>The cross-section turns about a neutral circle without changing its shape; only hoop stress
 * counts. With {@code d = De/Di}, deflection {@code s} and {@code C = 4E/(1 - nu²) * t/(K1 De²)}
 *
 * <pre>
 *   F = C s [ (h0 - s)(h0 - s/2) + t² ]
 *   K1 = ((d-1)/d)² / ( (d+1)/(d-1) - 2/ln d ) / pi
 * </pre>
 *
 * The standard puts one factor {@code K1} before both terms; the assumption itself gives the second
 * a factor that is larger by {@code (ln d)²/60}, 0.8 % at {@code d = 2}: far inside the tolerance
 * of real springs.
 *
 * <p>Valid while the spring is not flat; between 0.75 h0 and flat a real spring is stiffer, because
 * it rolls on its seats. Source: Almen and Laszlo, <i>The uniform-section disk spring</i>, Trans.
 * ASME 58, 1936, in the form of DIN EN 16984 (formerly DIN 2092).
 *
 * @param outerDiameter {@code De} (m)
 * @param innerDiameter {@code Di} (m)
 * @param thickness {@code t} (m)
 * @param coneHeight {@code h0}: free height less thickness (m)
 */
public record DiscSpring(
    double outerDiameter, double innerDiameter, double thickness, double coneHeight) {
  public static final Quantity OUTER_DIAMETER =
      new Quantity("disc_outer_diameter_mm", "disc outer diameter", "mm", 1e-3, 3, 1000, "");
  public static final Quantity INNER_DIAMETER =
      new Quantity("disc_inner_diameter_mm", "disc inner diameter", "mm", 1e-3, 1, 1000, "");
  public static final Quantity THICKNESS =
      new Quantity("disc_thickness_mm", "disc thickness", "mm", 1e-3, 0.1, 50, "");
  public static final Quantity CONE_HEIGHT =
      new Quantity(
          "disc_cone_height_mm",
          "disc cone height",
          "mm",
          1e-3,
          0.05,
          50,
          "the whole free height was given: take the thickness off");

  /** Young's modulus of spring steel (Pa) and its Poisson's ratio, as in DIN EN 16984. */
  private static final double MODULUS = 206e9;

  private static final double POISSON = 0.3;

  /** Checks every value and that the disc is a ring. */
  public DiscSpring {
    OUTER_DIAMETER.check(outerDiameter);
    INNER_DIAMETER.check(innerDiameter);
    THICKNESS.check(thickness);
    CONE_HEIGHT.check(coneHeight);
    if (!(innerDiameter <= 0.9 * outerDiameter)) {
      throw InvalidInput.value(
          INNER_DIAMETER.label(),
          innerDiameter * 1e3,
          "mm",
          String.format(
              Locale.ROOT, "at most 0.9 of the outer diameter of %.4g mm", outerDiameter * 1e3),
          "the two were swapped");
    }
  }

  /** Returns the force (N) at a deflection (m). */
  public double force(double s) {
    return factor() * s * ((coneHeight - s) * (coneHeight - s / 2) + thickness * thickness);
  }

  /** Returns the rate {@code dF/ds} (N/m) at a deflection (m). */
  public double rate(double s) {
    return factor()
        * (coneHeight * coneHeight - 3 * coneHeight * s + 1.5 * s * s + thickness * thickness);
  }

  /** Returns the force (N) that presses it flat. */
  public double flatForce() {
    return force(coneHeight);
  }

  /**
   * Returns the deflection (m) up to which the force rises: flat, or the first maximum of a spring
   * with {@code h0/t > sqrt(2)}.
   */
  public double risingDeflection() {
    double excess = coneHeight * coneHeight - 2 * thickness * thickness;
    return excess > 0 ? coneHeight - Math.sqrt(excess / 3) : coneHeight;
  }

  /**
   * Returns the deflection (m) at a force (N), on the branch on which the force rises from zero.
   *
   * @throws InvalidInput when the spring cannot give the force there
   */
  public double deflection(double force) {
    double high = risingDeflection();
    double most = force(high);
    if (!(force >= 0 && force <= most * (1 + 1e-12))) {
      throw InvalidInput.value(
          "force on a disc spring",
          force,
          "N",
          String.format(Locale.ROOT, "between 0 and %.1f N", most),
          "stack more springs in parallel");
    }
    double low = 0;
    for (int i = 0; i < 200 && high - low > 1e-15 * coneHeight; i++) {
      double middle = (low + high) / 2;
      if (force(middle) < force) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return (low + high) / 2;
  }

  /** Returns the hoop stress (Pa) at a deflection (m); positive is tension. */
  public double stress(Edge edge, double s) {
    double mean = coneHeight - s / 2;
    double scale = -factor() * s / thickness;
    return switch (edge) {
      case UPPER_INNER -> scale * (k2() * mean + k3() * thickness);
      case LOWER_INNER -> scale * (k2() * mean - k3() * thickness);
      case LOWER_OUTER -> scale / ratio() * ((k2() - 2 * k3()) * mean - k3() * thickness);
      case UPPER_OUTER -> scale / ratio() * ((k2() - 2 * k3()) * mean + k3() * thickness);
    };
  }

  /** Edges of the cross-section of a spring whose inner rim is the upper one. */
  public enum Edge {
    /** Point I: the largest pressure. */
    UPPER_INNER,
    /** Point II. */
    LOWER_INNER,
    /** Point III. */
    LOWER_OUTER,
    /** Point IV. */
    UPPER_OUTER
  }

  /** {@code 4E/(1 - nu²) * t/(K1 De²)} (N/m³). */
  private double factor() {
    return 4
        * MODULUS
        / (1 - POISSON * POISSON)
        * thickness
        / (k1() * outerDiameter * outerDiameter);
  }

  private double ratio() {
    return outerDiameter / innerDiameter;
  }

  /** Returns the shape factor {@code K1} (-). */
  double k1() {
    double d = ratio();
    double share = (d - 1) / d;
    return share * share / ((d + 1) / (d - 1) - 2 / Math.log(d)) / Math.PI;
  }

  /** Returns the stress factor {@code K2} (-). */
  double k2() {
    double log = Math.log(ratio());
    return 6 / Math.PI * ((ratio() - 1) / log - 1) / log;
  }

  /** Returns the stress factor {@code K3} (-). */
  double k3() {
    return 3 / Math.PI * (ratio() - 1) / Math.log(ratio());
  }
}
