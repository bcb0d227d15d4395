package rampwright.vehicle.lap;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.file.CarFile;
import rampwright.vehicle.file.FileSource;

class ShortSpiralTest {
  private static final double SPACING = 2;

  /** A straight, a spiral of 14 m into a radius of 14 m, and the arc. */
  private static Circuit hairpin() {
    List<Station> stations = new ArrayList<>();
    for (int i = 0; i <= 120; i++) {
      double s = i * SPACING;
      double curvature = Math.max(0, Math.min(1, (s - 200) / 14)) / 14;
      stations.add(Station.flat(s, curvature, s, 0));
    }
    return new Circuit("hairpin", false, 120 * SPACING, stations);
  }

  @Test
  void aShortSpiralStraightAfterAStraightIsFollowed() {
    FileSource samples = FileSource.classPath(getClass().getClassLoader(), "rampwright/samples/");
    Car car = CarFile.read(samples, "cars/touring_car.yaml");
    Lap lap =
        LapSolver.solve(
            new LapRequest(
                car,
                DifferentialSet.rear(OpenDifferential.IDEAL),
                Conditions.STANDARD,
                Driver.QUICK,
                LimitForm.CAR,
                hairpin(),
                SPACING));
    double onTheArc = lap.trace().get(Channel.SPEED, (int) (230 / SPACING));
    // friction 1.4 to 1.6 on a radius of 14 m: sqrt(1.5 * 9.81 * 14) = 14 m/s
    assertThat(onTheArc).isBetween(12.0, 15.0);
    double atStartOfSpiral = lap.trace().get(Channel.SPEED, (int) (202 / SPACING));
    assertThat(atStartOfSpiral).isBetween(onTheArc, 40.0);
  }
}
