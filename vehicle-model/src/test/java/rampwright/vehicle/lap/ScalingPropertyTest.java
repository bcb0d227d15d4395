package rampwright.vehicle.lap;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.DoubleRange;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.driveline.Engine;
import rampwright.vehicle.driveline.TorqueCurve;
import rampwright.vehicle.tyre.PeakAtLoad;
import rampwright.vehicle.tyre.PeakSlipTyre;
import rampwright.vehicle.tyre.SlipCurve;
import rampwright.vehicle.tyre.Tyre;

/** Laws of similarity: what may change together without changing the lap, or by a known factor. */
@Tag("property")
class ScalingPropertyTest {
  private static final double LENGTH = 900;

  private static Circuit circuit(double length) {
    double turn = 2 * Math.PI / length;
    return PointMass.line(
        true,
        length,
        length / 450,
        s -> turn * (1 + 2.2 * Math.cos(2 * turn * s) + 0.9 * Math.cos(3 * turn * s)));
  }

  private static double time(CarBuilder car, double preload, double length) {
    return LapSolver.solve(
            new LapRequest(
                car.build(),
                DifferentialSet.rear(new PlateDifferential(preload, 0.3, 0.2)),
                Conditions.STANDARD,
                Driver.QUICK,
                LimitForm.CAR,
                circuit(length),
                length / 150))
        .time();
  }

  private static Tyre tyre(double loadFactor) {
    return new PeakSlipTyre(
        new PeakAtLoad(2000 * loadFactor, 1.58, 1.55, 0.105, Math.toRadians(7)),
        new PeakAtLoad(5000 * loadFactor, 1.42, 1.40, 0.115, Math.toRadians(8)),
        SlipCurve.peakAtOne(1.6),
        SlipCurve.peakAtOne(1.6));
  }

  private static Engine engine(double torqueFactor, double speedFactor) {
    return new Engine(
        new TorqueCurve(
            List.of(
                new TorqueCurve.Point(150 * speedFactor, 200 * torqueFactor),
                new TorqueCurve.Point(550 * speedFactor, 330 * torqueFactor),
                new TorqueCurve.Point(890 * speedFactor, 276 * torqueFactor))),
        new TorqueCurve(
            List.of(
                new TorqueCurve.Point(100 * speedFactor, -18 * torqueFactor),
                new TorqueCurve.Point(890 * speedFactor, -86 * torqueFactor))),
        890 * speedFactor);
  }

  /** Every mass, force and torque by one factor: the same lap, but for the solver's own steps. */
  @Property(tries = 5)
  void aCarThatIsHeavierAndStrongerInProportionDrivesTheSameLap(
      @ForAll @DoubleRange(min = 0.5, max = 2) double factor) {
    CarBuilder plain = new CarBuilder();
    plain.engine = engine(1, 1);
    CarBuilder heavy = new CarBuilder();
    heavy.mass *= factor;
    heavy.yawInertia *= factor;
    heavy.dragArea *= factor;
    heavy.downforceFront *= factor;
    heavy.downforceRear *= factor;
    heavy.brakeTorque *= factor;
    heavy.front = tyre(factor);
    heavy.rear = heavy.front;
    heavy.engine = engine(factor, 1);
    double time = time(plain, 60, LENGTH);
    assertThat(time(heavy, 60 * factor, LENGTH)).isCloseTo(time, within(5e-4 * time));
  }

  /**
   * Every length by one factor at the same gravity and mass: times by its square root, as with
   * Froude's law. Areas of the air then shrink with length, torques grow with it, and engine speeds
   * fall with the root.
   */
  @Property(tries = 5)
  void aCarAndCircuitOfAnotherSizeFollowFroudesLaw(
      @ForAll @DoubleRange(min = 0.8, max = 1.25) double size) {
    CarBuilder plain = new CarBuilder();
    plain.engine = engine(1, 1);
    CarBuilder other = new CarBuilder();
    other.wheelbase *= size;
    other.cgToFrontAxle *= size;
    other.cgHeight *= size;
    other.trackFront *= size;
    other.trackRear *= size;
    other.rollCentreFront *= size;
    other.rollCentreRear *= size;
    other.yawInertia *= size * size;
    other.frontRadius *= size;
    other.rearRadius *= size;
    other.dragArea /= size;
    other.downforceFront /= size;
    other.downforceRear /= size;
    other.brakeTorque *= size;
    other.engine = engine(size, 1 / Math.sqrt(size));
    double time = time(plain, 60, LENGTH) * Math.sqrt(size);
    assertThat(time(other, 60 * size, LENGTH * size)).isCloseTo(time, within(1e-3 * time));
  }
}
