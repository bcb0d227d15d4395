package rampwright.web.work;

import java.util.List;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Station;

/** Where on the map a distance along a circuit is. */
public final class LinePlaces {
  private final Circuit circuit;
  private int near;

  /** Reads a circuit, whose stations have positions. */
  public LinePlaces(Circuit circuit) {
    this.circuit = circuit;
  }

  /**
   * A place on the map.
   *
   * @param x position (m)
   * @param y position (m)
   */
  public record Place(double x, double y) {}

  /** Returns the place at a distance (m); quickest when distances rise from call to call. */
  public Place at(double distance) {
    List<Station> stations = circuit.stations();
    if (stations.get(near).distance() > distance) {
      near = 0;
    }
    while (near + 1 < stations.size() && stations.get(near + 1).distance() <= distance) {
      near++;
    }
    Station from = stations.get(near);
    boolean last = near + 1 == stations.size();
    if (last && !circuit.closed()) {
      return new Place(from.x(), from.y());
    }
    Station to = stations.get(last ? 0 : near + 1);
    double end = last ? circuit.length() : to.distance();
    double share = Math.min(1, (distance - from.distance()) / (end - from.distance()));
    return new Place(
        from.x() + share * (to.x() - from.x()), from.y() + share * (to.y() - from.y()));
  }
}
