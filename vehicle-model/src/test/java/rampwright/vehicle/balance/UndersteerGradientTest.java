package rampwright.vehicle.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.trim.Trim;
import rampwright.vehicle.trim.Trims;

class UndersteerGradientTest {
  private static final double GRAVITY = 9.81;
  private static final double LITTLE = 0.2;

  private static UndersteerGradient gradient(Car car, Differential rear) {
    return UndersteerGradient.atConstantSpeed(car, Conditions.STANDARD, DifferentialSet.rear(rear));
  }

  /** Wong's passenger car; stiffness per tyre (N/rad). */
  private static Car wong(double frontTyre, double rearTyre) {
    double length = 2.8;
    return LinearCar.of(
        20105 / GRAVITY, 2500, length * 0.465, length * 0.535, 2 * frontTyre, 2 * rearTyre, 120e3);
  }

  /**
   * Wong, Theory of Ground Vehicles, example 5.1: W 20.105 kN, L 2.8 m, 53.5 % on the front axle,
   * 38.92 and 38.25 kN/rad per tyre; printed K 0.016 rad per g, characteristic speed 149 km/h (from
   * memory). Recomputed in double precision: 0.015976 rad, 41.46 m/s.
   */
  @Test
  @Tag("validation")
  void wongsPassengerCarUndersteers() {
    UndersteerGradient gradient = gradient(wong(38920, 38250), OpenDifferential.IDEAL);
    HandlingGradients atSpeed = gradient.atSpeed(25, LITTLE).orElseThrow();
    HandlingGradients onRadius = gradient.onRadius(1000, LITTLE).orElseThrow();
    assertThat(atSpeed.understeer() * GRAVITY).isCloseTo(0.015976, within(0.00002));
    assertThat(onRadius.understeer() * GRAVITY).isCloseTo(0.015976, within(0.00004));
    assertThat(atSpeed.characteristicSpeed() * 3.6).isCloseTo(149.3, within(0.2));
    assertThat(atSpeed.criticalSpeed()).isNaN();
  }

  /** The same example with front tyres of 47.82 kN/rad: K -0.009742 rad, 53.10 m/s. */
  @Test
  @Tag("validation")
  void wongsCarWithStifferFrontTyresOversteersAndIsUnstableAboveItsCriticalSpeed() {
    Car car = wong(47820, 38250);
    HandlingGradients found =
        gradient(car, OpenDifferential.IDEAL).atSpeed(25, LITTLE).orElseThrow();
    assertThat(found.understeer() * GRAVITY).isCloseTo(-0.009742, within(0.00002));
    assertThat(found.criticalSpeed()).isCloseTo(53.10, within(0.05));
    assertThat(found.characteristicSpeed()).isNaN();
    Trims trims = new Trims(car, Conditions.STANDARD, DifferentialSet.rear(OpenDifferential.IDEAL));
    assertThat(trims.constantSpeed(0.998 * 53.10, 0, 0).orElseThrow().sigma()).isNegative();
    assertThat(trims.constantSpeed(1.002 * 53.10, 0, 0).orElseThrow().sigma()).isPositive();
  }

  /**
   * University exercise: 1008 kg, 1031 kg·m², 1.2 and 1.0 m, 117 and 145 kN/rad per axle (the
   * inputs were read); K 1.24234e-4 rad·s²/m and characteristic speed 133.07 m/s by m (lr Cr - lf
   * Cf)/(L Cf Cr).
   */
  @Test
  @Tag("validation")
  void aUniversityExerciseIsNearlyNeutral() {
    Car car = LinearCar.of(1008, 1031, 1.2, 1.0, 117e3, 145e3, 120e3);
    HandlingGradients found =
        gradient(car, OpenDifferential.IDEAL).atSpeed(20, LITTLE).orElseThrow();
    assertThat(found.understeer()).isCloseTo(1.24234e-4, within(2e-7));
    assertThat(found.characteristicSpeed()).isCloseTo(133.07, within(0.1));
  }

  /**
   * Sideslip gradient of a linear car: {@code -a m / (Cr L)} from {@code beta = b/R - a m ay/(L
   * Cr)}.
   */
  @Test
  @Tag("validation")
  void theSideslipGradientIsThatOfALinearCar() {
    Car car = LinearCar.of(1008, 1031, 1.2, 1.0, 117e3, 145e3, 120e3);
    HandlingGradients found =
        gradient(car, OpenDifferential.IDEAL).onRadius(1000, LITTLE).orElseThrow();
    double expected = -1.2 * 1008 / (145e3 * 2.2);
    assertThat(found.sideslip()).isCloseTo(expected, within(0.005 * Math.abs(expected)));
  }

  /**
   * Linear bicycle with a yaw moment (our derivation): {@code delta = L/R + K ay - Mz (Cf+Cr)/(L Cf
   * Cr)}. m 1300, a 1.25, b 1.35, 90 and 110 kN/rad, R 100 m, 20 m/s: 1.9064 degrees without
   * moment, 2.1290 with 500 N·m out of the turn.
   */
  @Test
  @Tag("validation")
  void aSlidingUnitAddsTheSteerAngleThatItsYawMomentAsksFor() {
    Car car = LinearCar.of(1300, 1800, 1.25, 1.35, 90e3, 110e3, 200e3);
    double difference = 500 * 2 * LinearCar.RADIUS / LinearCar.TRACK;
    Trim free = trim(car, OpenDifferential.IDEAL);
    Trim locking = trim(car, new PlateDifferential(difference, 0, 0));
    assertThat(locking.yawMomentDifferential()).isCloseTo(500, within(0.5));
    assertThat(locking.axles().get(1).sticking()).isFalse();
    // large angles and the small drive force cost the model less than 0.02 degrees
    assertThat(Math.toDegrees(free.steer())).isCloseTo(1.9064, within(0.02));
    double more = Math.toDegrees(locking.steer() - free.steer());
    // at 2.6 degrees of slip angle the tyres of this car are 3 % softer than at zero
    assertThat(more).isCloseTo(2.1290 - 1.9064, within(0.04 * (2.1290 - 1.9064)));
  }

  private static Trim trim(Car car, Differential rear) {
    return new Trims(car, Conditions.STANDARD, DifferentialSet.rear(rear))
        .constantSpeed(20, 1.0 / 100, 0)
        .orElseThrow();
  }

  @Test
  void powerAndOverrunChangeTheGradientOfALockingUnit() {
    Car car = SampleLaps.car();
    DifferentialSet set = DifferentialSet.rear(new PlateDifferential(60, 0.3, 0.3));
    HandlingGradients steady =
        UndersteerGradient.atConstantSpeed(car, Conditions.STANDARD, set)
            .onRadius(100, 6)
            .orElseThrow();
    HandlingGradients power =
        UndersteerGradient.atCageTorque(car, Conditions.STANDARD, set, 500)
            .onRadius(100, 6)
            .orElseThrow();
    HandlingGradients overrun =
        UndersteerGradient.atCageTorque(car, Conditions.STANDARD, set, -300)
            .onRadius(100, 6)
            .orElseThrow();
    assertThat(power.understeer()).isNotCloseTo(steady.understeer(), within(1e-5));
    assertThat(overrun.understeer()).isNotCloseTo(steady.understeer(), within(1e-5));
  }

  @Test
  void beyondTheCorneringLimitThereIsNoGradient() {
    UndersteerGradient gradient = gradient(SampleLaps.car(), OpenDifferential.IDEAL);
    assertThat(gradient.onRadius(100, 30)).isEmpty();
  }
}
