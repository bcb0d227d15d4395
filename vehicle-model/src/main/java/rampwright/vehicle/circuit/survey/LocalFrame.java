package rampwright.vehicle.circuit.survey;

/**
 * Plane through a place on the WGS 84 ellipsoid, x to the east and y to the north.
 *
 * <p>Geographic to geocentric to topocentric coordinates, EPSG methods 9602 and 9836: IOGP
 * Publication 373-7-2, <i>Geomatics Guidance Note 7, part 2: Coordinate Conversions and
 * Transformations including Formulas</i>. Seen from above; a kilometre from the origin the
 * shortening by the earth's curvature is 4 µm.
 */
final class LocalFrame {
  /** Semi-major axis of WGS 84 (m). */
  private static final double A = 6_378_137;

  /** Flattening of WGS 84. */
  private static final double F = 1 / 298.257223563;

  private static final double E2 = F * (2 - F);

  private final double latitude;
  private final double longitude;
  private final Geocentric origin;

  /**
   * A point in earth-centred axes.
   *
   * @param x towards latitude 0, longitude 0 (m)
   * @param y towards latitude 0, 90° east (m)
   * @param z towards the north pole (m)
   */
  record Geocentric(double x, double y, double z) {}

  /**
   * Returns the frame of an origin.
   *
   * @param latitude of the origin (rad)
   * @param longitude of the origin (rad)
   * @param height of the origin above the ellipsoid (m)
   */
  LocalFrame(double latitude, double longitude, double height) {
    this.latitude = latitude;
    this.longitude = longitude;
    this.origin = geocentric(latitude, longitude, height);
  }

  static Geocentric geocentric(double latitude, double longitude, double height) {
    double sin = Math.sin(latitude);
    double nu = A / Math.sqrt(1 - E2 * sin * sin);
    double fromAxis = (nu + height) * Math.cos(latitude);
    return new Geocentric(
        fromAxis * Math.cos(longitude),
        fromAxis * Math.sin(longitude),
        (nu * (1 - E2) + height) * sin);
  }

  /** Returns how far east of the origin a place lies (m). */
  double east(Geocentric place) {
    return -Math.sin(longitude) * (place.x() - origin.x())
        + Math.cos(longitude) * (place.y() - origin.y());
  }

  /** Returns how far north of the origin a place lies (m). */
  double north(Geocentric place) {
    double outward =
        Math.cos(longitude) * (place.x() - origin.x())
            + Math.sin(longitude) * (place.y() - origin.y());
    return Math.cos(latitude) * (place.z() - origin.z()) - Math.sin(latitude) * outward;
  }

  /** Returns how far above the plane a place lies (m). */
  double up(Geocentric place) {
    double outward =
        Math.cos(longitude) * (place.x() - origin.x())
            + Math.sin(longitude) * (place.y() - origin.y());
    return Math.sin(latitude) * (place.z() - origin.z()) + Math.cos(latitude) * outward;
  }
}
