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
    return CarFile.read(
        FileSource.classPath(SampleLaps.class.getClassLoader(), "rampwright/samples/"),
        "cars/touring_car.yaml");
  }

  static Lap fast(Differential rear) {
    return lap(SampleCircuits.fast(), rear);
  }

  static Lap slow(Differential rear) {
    return lap(SampleCircuits.slow(), rear);
  }

  static Lap lap(Circuit circuit, Differential rear) {
    return LapSolver.solve(
        new LapRequest(
            car(),
            DifferentialSet.rear(rear),
            Conditions.STANDARD,
            Driver.QUICK,
            LimitForm.DRIVER,
            circuit,
            SPACING));
  }
}
