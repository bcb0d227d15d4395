package rampwright.vehicle.circuit;

import java.util.List;
import rampwright.vehicle.input.InvalidInput;

/**
 * A driven line as stations along its length.
 *
 * @param name a name for people
 * @param closed whether the end joins the start
 * @param length length of the lap or run (m); for a closed circuit the distance from the first
 *     station round to itself
 * @param stations at least five, with rising distance from 0; the first station of a closed circuit
 *     is not repeated at its end, the last station of an open one stands at {@code length}
 */
public record Circuit(String name, boolean closed, double length, List<Station> stations) {
  /** Checks the order of the stations and the length. */
  public Circuit {
    stations = List.copyOf(stations);
    if (name == null || name.isBlank()) {
      throw InvalidInput.of("name of the circuit", "blank", "some text", "");
    }
    if (stations.size() < 5) {
      throw InvalidInput.of(
          "circuit " + name, stations.size() + " stations", "at least 5 stations", "");
    }
    for (int i = 1; i < stations.size(); i++) {
      if (!(stations.get(i).distance() > stations.get(i - 1).distance())) {
        throw InvalidInput.value(
            "distance of station " + (i + 1),
            stations.get(i).distance(),
            "m",
            "above that of the station before it",
            "");
      }
    }
    double first = stations.get(0).distance();
    double last = stations.get(stations.size() - 1).distance();
    if (first != 0) {
      throw InvalidInput.value(
          "distance of the first station", first, "m", "0", "subtract it from every station");
    }
    if (closed ? !(length > last) : !(Math.abs(length - last) <= 1e-9 * length)) {
      throw InvalidInput.value(
          "length of the circuit",
          length,
          "m",
          closed
              ? "above the last station's distance of " + last + " m"
              : "the last station's distance of " + last + " m",
          "");
    }
  }
}
