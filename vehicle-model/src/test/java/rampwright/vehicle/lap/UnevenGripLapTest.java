package rampwright.vehicle.lap;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;

/** Laps of a road that is slippery under the wheels of one side, as beside a damp line. */
class UnevenGripLapTest {
  private static final double DAMP = 0.8;

  private static double time(Differential law, double left, double right) {
    Circuit dry = SampleCircuits.slow();
    List<Station> stations =
        dry.stations().stream()
            .map(
                s ->
                    new Station(
                        s.distance(),
                        s.curvature(),
                        s.x(),
                        s.y(),
                        s.grade(),
                        s.bank(),
                        left,
                        right))
            .toList();
    Circuit circuit = new Circuit("one side damp", true, dry.length(), stations);
    return LapSolver.solve(
            new LapRequest(
                new CarBuilder().build(),
                DifferentialSet.rear(law),
                Conditions.STANDARD,
                Driver.QUICK,
                LimitForm.DRIVER,
                circuit,
                5))
        .time();
  }

  @Test
  void oneDampSideCostsLessThanTwo() {
    Differential plate = new PlateDifferential(60, 0.3, 0.15);
    double dry = time(plate, 1, 1);
    double half = time(plate, DAMP, 1);
    double damp = time(plate, DAMP, DAMP);
    assertThat(half).isBetween(dry + 0.5, damp - 0.5);
  }

  /** Common practice, no source: uneven grip is where a lock pays most. */
  @Test
  void lockGainsMoreOnUnevenGripThanOnEven() {
    Differential lock = new PlateDifferential(60, 0.3, 0.15);
    double onEven = time(OpenDifferential.IDEAL, 1, 1) - time(lock, 1, 1);
    double onUneven = time(OpenDifferential.IDEAL, DAMP, 1) - time(lock, DAMP, 1);
    assertThat(onUneven).isGreaterThan(onEven);
  }
}
