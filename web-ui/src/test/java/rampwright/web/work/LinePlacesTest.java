package rampwright.web.work;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Station;

class LinePlacesTest {
  private static final double RADIUS = 100;
  private static final int STATIONS = 200;

  /** Points on a chord lie within R(1 - cos(half the angle)) of the circle. */
  private static final double SAGITTA = RADIUS * (1 - Math.cos(Math.PI / STATIONS));

  private static Circuit circle() {
    List<Station> stations = new ArrayList<>();
    for (int i = 0; i < STATIONS; i++) {
      double angle = 2 * Math.PI * i / STATIONS;
      stations.add(
          Station.flat(
              RADIUS * angle, 1 / RADIUS, RADIUS * Math.cos(angle), RADIUS * Math.sin(angle)));
    }
    return new Circuit("circle", true, 2 * Math.PI * RADIUS, stations);
  }

  @Test
  void everyPlaceOfACircleIsOnIt() {
    LinePlaces places = new LinePlaces(circle());
    for (double share : new double[] {0, 0.1, 0.4999, 0.77, 0.9999, 0.02}) {
      double angle = 2 * Math.PI * share;
      LinePlaces.Place place = places.at(RADIUS * angle);
      assertThat(place.x()).isCloseTo(RADIUS * Math.cos(angle), within(SAGITTA + 1e-9));
      assertThat(place.y()).isCloseTo(RADIUS * Math.sin(angle), within(SAGITTA + 1e-9));
    }
  }

  @Test
  void anOpenLineEndsAtItsLastStation() {
    List<Station> stations = circle().stations();
    double length = stations.get(STATIONS - 1).distance();
    LinePlaces places = new LinePlaces(new Circuit("arc", false, length, stations));
    LinePlaces.Place end = places.at(length);
    assertThat(end.x()).isEqualTo(stations.get(STATIONS - 1).x());
    assertThat(end.y()).isEqualTo(stations.get(STATIONS - 1).y());
  }
}
