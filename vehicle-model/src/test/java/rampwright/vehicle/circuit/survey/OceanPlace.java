package rampwright.vehicle.circuit.survey;

/** Latitude and longitude of places in the plane of a {@link LocalFrame}, for made-up files. */
final class OceanPlace {
  private OceanPlace() {}

  /**
   * Inverts the projection by a few corrections with the radius of a sphere.
   *
   * @return latitude and longitude (rad)
   */
  static double[] of(double originLatitude, double originLongitude, double x, double y) {
    LocalFrame frame = new LocalFrame(originLatitude, originLongitude, 0);
    double latitude = originLatitude;
    double longitude = originLongitude;
    for (int step = 0; step < 6; step++) {
      LocalFrame.Geocentric place = LocalFrame.geocentric(latitude, longitude, 0);
      latitude += (y - frame.north(place)) / 6.37e6;
      longitude += (x - frame.east(place)) / (6.37e6 * Math.cos(originLatitude));
    }
    return new double[] {latitude, longitude};
  }
}
