package rampwright.vehicle.lap;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.file.CarFile;
import rampwright.vehicle.file.FileSource;

/**
 * How much drive lock a circuit wants (common practice, no source: less on a fast circuit). The
 * sample car understeers so much that lock never upsets it; here more of its roll stiffness is at
 * the rear, as on a car whose rear axle is the one that gives up first.
 */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class LockDemandTest {
  private static final String CAR = "cars/touring_car.yaml";
  private static final double SPACING = 4;

  /** From little lock to all of it. */
  private static final List<Differential> LAWS =
      List.of(
          new PlateDifferential(20, 0.15, 0.15),
          new PlateDifferential(20, 0.3, 0.3),
          new PlateDifferential(20, 0.6, 0.3),
          new Spool());

  private Car car;

  @BeforeAll
  void readTheCar() throws IOException {
    String sample = new String(SampleFiles.open(CAR).readAllBytes(), StandardCharsets.UTF_8);
    String stiffAtTheRear = sample.replace("front_roll_share: 0.57", "front_roll_share: 0.45");
    assertThat(stiffAtTheRear).isNotEqualTo(sample);
    FileSource files =
        path ->
            path.equals(CAR)
                ? new ByteArrayInputStream(stiffAtTheRear.getBytes(StandardCharsets.UTF_8))
                : SampleFiles.open(path);
    car = CarFile.read(files, CAR);
  }

  @Test
  void withTheDriversLimitsTheFastCircuitWantsLessDriveLockThanTheSlowOne() {
    int fast = best(SampleCircuits.fast());
    int slow = best(SampleCircuits.slow());

    assertThat(fast).isLessThan(slow);
    assertThat(fast).isPositive().isLessThan(LAWS.size() - 1);
  }

  private int best(Circuit circuit) {
    int best = 0;
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < LAWS.size(); i++) {
      LapRequest request =
          new LapRequest(
              car,
              DifferentialSet.rear(LAWS.get(i)),
              Conditions.STANDARD,
              Driver.CAUTIOUS,
              LimitForm.DRIVER,
              circuit,
              SPACING);
      double time = LapSolver.solve(request).time();
      if (time < least) {
        least = time;
        best = i;
      }
    }
    return best;
  }
}
