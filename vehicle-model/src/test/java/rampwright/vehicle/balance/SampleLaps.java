package rampwright.vehicle.balance;

import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.file.CarFile;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapRequest;
import rampwright.vehicle.lap.LapSolver;
import rampwright.vehicle.lap.LimitForm;

/** Laps of the sample car. */
final class SampleLaps {
  static final double SPACING = 5;

  private SampleLaps() {}

  static Car car() {
    return car("touring_car");
  }

  private static Car car(String name) {
    return CarFile.read(
        FileSource.classPath(SampleLaps.class.getClassLoader(), "rampwright/samples/"),
        "cars/" + name + ".yaml");
  }

  /** A lap of the slow circuit of another sample car with all of its differentials. */
  static Lap of(String car, DifferentialSet differentials) {
    return lap(car(car), SampleCircuits.slow(), differentials, 1);
  }

  static Lap fast(Differential rear) {
    return lap(SampleCircuits.fast(), rear, SPACING);
  }

  static Lap slow(Differential rear) {
    return lap(SampleCircuits.slow(), rear, SPACING);
  }

  static Lap lap(Circuit circuit, Differential rear, double spacing) {
    return lap(car(), circuit, DifferentialSet.rear(rear), spacing);
  }

  private static Lap lap(Car car, Circuit circuit, DifferentialSet differentials, double spacing) {
    return LapSolver.solve(
        new LapRequest(
            car,
            differentials,
            Conditions.STANDARD,
            Driver.QUICK,
            LimitForm.DRIVER,
            circuit,
            spacing));
  }
}
