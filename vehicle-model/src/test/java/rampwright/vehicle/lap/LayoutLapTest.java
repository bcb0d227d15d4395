package rampwright.vehicle.lap;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.differential.BrakeLock;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.differential.TorqueSensingDifferential;
import rampwright.vehicle.differential.ViscousDifferential;
import rampwright.vehicle.file.CarFile;
import rampwright.vehicle.file.FileSource;

/** Laps of the sample cars that drive other axles. */
class LayoutLapTest {
  private static Lap lap(String file, DifferentialSet set, Circuit circuit) {
    return lap(file, set, circuit, LimitForm.DRIVER);
  }

  private static Lap lap(String file, DifferentialSet set, Circuit circuit, LimitForm form) {
    Car car =
        CarFile.read(
            FileSource.classPath(LayoutLapTest.class.getClassLoader(), "rampwright/samples/"),
            "cars/" + file);
    return LapSolver.solve(
        new LapRequest(car, set, Conditions.STANDARD, Driver.QUICK, form, circuit, 5));
  }

  private static Differential law(String name) {
    return switch (name) {
      case "open" -> OpenDifferential.IDEAL;
      case "plate" -> new PlateDifferential(50, 0.3, 0.12);
      case "viscous" -> new ViscousDifferential(120, 4, 0.6);
      case "gear" -> new TorqueSensingDifferential(15, 2.2, 1.6);
      case "brake" -> new BrakeLock(0.03, 6000, 600);
      default -> new Spool();
    };
  }

  @ParameterizedTest
  @CsvSource({"open", "brake", "spool"})
  void theFrontDrivenSaloonLapsBothCircuits(String name) {
    DifferentialSet set =
        new DifferentialSet(law(name), OpenDifferential.IDEAL, OpenDifferential.IDEAL);
    check(lap("front_drive_saloon.yaml", set, SampleCircuits.fast()), 100, 118);
    check(lap("front_drive_saloon.yaml", set, SampleCircuits.slow()), 92, 112);
  }

  /**
   * A saloon that pushes asks little of its driver; its own limits are no other branch of trims.
   */
  @Test
  void theSaloonsOwnLimitsAreHardlyFasterThanAQuickDriver() {
    DifferentialSet open = DifferentialSet.rear(OpenDifferential.IDEAL);
    Lap driver = lap("front_drive_saloon.yaml", open, SampleCircuits.slow());
    Lap own = lap("front_drive_saloon.yaml", open, SampleCircuits.slow(), LimitForm.CAR);
    check(own, 92, 112);
    assertThat(own.time()).isBetween(driver.time() - 0.2, driver.time() + 1e-3);
  }

  @ParameterizedTest
  @CsvSource({"open,open,open", "gear,viscous,plate", "plate,brake,spool"})
  void theRallyCarLapsBothCircuits(String front, String centre, String rear) {
    DifferentialSet set = new DifferentialSet(law(front), law(centre), law(rear));
    check(lap("all_wheel_drive_rally.yaml", set, SampleCircuits.fast()), 90, 105);
    check(lap("all_wheel_drive_rally.yaml", set, SampleCircuits.slow()), 86, 100);
  }

  /** The band is wide on purpose: it catches a lap that is no lap, not a model that is refined. */
  private static void check(Lap lap, double least, double most) {
    assertThat(lap.time()).isBetween(least, most);
    int last = lap.road().size() - 1;
    for (int i = 0; i <= last; i++) {
      double ax = lap.trace().get(Channel.AX, i);
      assertThat(lap.trace().get(Channel.SPEED, i)).isBetween(5.0, 80.0);
      assertThat(ax).isBetween(-20.0, 15.0);
    }
  }
}
