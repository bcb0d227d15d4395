package rampwright.vehicle.manoeuvre;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import rampwright.vehicle.Car;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.file.CarFile;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.input.InvalidInput;

class TurnChecksTest {
  private static Car sample(String name) {
    return CarFile.read(
        FileSource.classPath(TurnChecksTest.class.getClassLoader(), "rampwright/samples/"),
        "cars/" + name + ".yaml");
  }

  private static TurnResponse run(Car car, Differential law, TurnManoeuvre manoeuvre) {
    return new TurnChecks(
            car, Conditions.STANDARD, new DifferentialSet(law, law, law), RotatingParts.USUAL)
        .run(manoeuvre)
        .orElseThrow();
  }

  @Test
  void theMotionBeginsInTheSteadyTurn() {
    TurnResponse r =
        run(sample("touring_car"), new PlateDifferential(60, 0.3, 0.1), TurnManoeuvre.powerOff(5));
    MotionSample first = r.motion().samples().get(0);
    assertThat(first.ax()).isCloseTo(0, within(1e-6));
    assertThat(first.ay()).isCloseTo(5, within(1e-5));
    assertThat(r.motion().ending()).isEqualTo(Motion.Ending.COMPLETE);
    assertThat(r.motion().samples()).hasSize(201);
    assertThat(r.motion().last().time()).isCloseTo(2, within(1e-9));
  }

  /** Common practice, no source: a front-driven car tucks in when lifted and runs wide on power. */
  @Test
  void aFrontDrivenCarTucksInWithoutPowerAndRunsWideWithIt() {
    Car saloon = sample("front_drive_saloon");
    TurnResponse off = run(saloon, OpenDifferential.IDEAL, TurnManoeuvre.powerOff(6));
    assertThat(off.yawRateDeviation()).isPositive();
    assertThat(off.sideslipChange()).isPositive();
    TurnResponse on = run(saloon, OpenDifferential.IDEAL, TurnManoeuvre.throttleOn(6, 1));
    assertThat(on.yawRateDeviation()).isNegative();
  }

  /** Common practice, no source: lock on overrun calms a rear-driven car that is lifted. */
  @Test
  void lockOnOverrunCalmsALiftedCar() {
    Car touring = sample("touring_car");
    TurnManoeuvre lift = TurnManoeuvre.powerOff(10);
    double open = run(touring, OpenDifferential.IDEAL, lift).peakYawRateDeviation();
    double plate = run(touring, new PlateDifferential(60, 0.3, 0.3), lift).peakYawRateDeviation();
    double locked = run(touring, new Spool(), lift).peakYawRateDeviation();
    assertThat(plate).isLessThan(open);
    assertThat(locked).isLessThanOrEqualTo(plate);
  }

  /** Common practice, no source: too much throttle in a turn brings the tail of such a car out. */
  @Test
  void fullThrottleBringsTheTailOfARearDrivenCarOut() {
    CarBuilder b = new CarBuilder();
    b.engine = CarBuilder.strongestAt(400_000, 800, 890);
    TurnResponse r = run(b.build(), new Spool(), TurnManoeuvre.throttleOn(10, 1));
    assertThat(r.peakSideslipChange()).isGreaterThan(0.2);
  }

  /** Closed form: brakes against car and wheels that roll, {@code a = F/(m + 4 I/R²)}. */
  @Test
  void almostStraightTheCarSlowsAsMassAndWheelsSay() {
    CarBuilder b = new CarBuilder();
    b.dragArea = 0;
    TurnManoeuvre braking = new TurnManoeuvre(TurnManoeuvre.Kind.BRAKING, 4000, 0.2, 4);
    TurnResponse r = run(b.build(), OpenDifferential.IDEAL, braking);
    double expected = 4 / (1 + 4 * 1.1 / (0.318 * 0.318) / 1180);
    double ax = r.motion().samples().get(100).ax();
    assertThat(-ax).isCloseTo(expected, within(0.01 * expected));
  }

  @Test
  void hardBrakingInATurnEndsWhereAWheelLocks() {
    TurnResponse r =
        run(sample("touring_car"), OpenDifferential.IDEAL, TurnManoeuvre.braking(8, 30));
    assertThat(r.motion().ending()).isEqualTo(Motion.Ending.WHEEL_LOCKED);
    assertThat(r.motion().last().time()).isLessThan(2);
  }

  @Test
  void aTurnBeyondTheTyresHasNoResponse() {
    TurnChecks checks =
        new TurnChecks(
            sample("front_drive_saloon"),
            Conditions.STANDARD,
            DifferentialSet.rear(new Spool()),
            RotatingParts.USUAL);
    assertThat(checks.run(TurnManoeuvre.powerOff(14))).isEmpty();
  }

  @Test
  void aThrottleInPercentIsRejected() {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> TurnManoeuvre.throttleOn(5, 50))
        .withMessage(
            "The throttle (50) must be a share from 0 to 1. Maybe it was given in percent.");
  }
}
