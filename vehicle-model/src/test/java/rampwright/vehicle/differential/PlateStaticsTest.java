package rampwright.vehicle.differential;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Plate packs and ramps against worked examples of the textbooks. */
@Tag("validation")
class PlateStaticsTest {
  private static final double INCH = 0.0254;
  private static final double POUND_FORCE = 4.4482216152605;

  /** A unit whose packs are the clutch of an example; diameters in mm. */
  private static PlateBuild clutch(
      double outer,
      double inner,
      double friction,
      FacePressure pressure,
      int faces,
      double torque) {
    PlateHardware hardware =
        new PlateHardware(outer / 2000, inner / 2000, friction, 0.04, 0, pressure);
    // one pack carries the torque of the example: half of the whole difference
    return new PlateBuild(
        hardware, new RingSet("none", Math.PI / 2, Math.PI / 2, false), false, faces, 2 * torque);
  }

  /**
   * Bhandari, Design of Machine Elements, example 11.8: 5 steel and 4 bronze plates of 150 by 75
   * mm, friction 0.1, 0.3 MPa, uniform wear: 8 pairs, 2650.718801 N, 119282.346 N·mm.
   */
  @Test
  void theMultiPlateClutchOfBhandari() {
    PlateBuild build = clutch(150, 75, 0.1, FacePressure.UNIFORM_WEAR, 8, 119.282346);
    assertThat(build.preloadForce()).isCloseTo(2650.718801, within(1e-5));
    double fromPressure = Math.PI * 0.3e6 * 0.075 * (0.150 - 0.075) / 2;
    assertThat(build.preloadForce()).isCloseTo(fromPressure, within(1e-5));
  }

  /**
   * One pair of faces of 300 by 225 mm, friction 0.25, 5000 N (a university exercise after Shigley,
   * printed 164.063 N·m for wear; 165.179 for even pressure recomputed); two faces of 250 by 175
   * mm, friction 0.35, 7200 N for 250 N·m (Bhandari, example 11.6: safety factors 2.142000 and
   * 2.164235); one pair of 250 by 175 mm, 0.30, 4 kN (Shigley, problem 16-16, from memory: 127.5
   * and 128.8 N·m).
   */
  @ParameterizedTest
  @CsvSource({
    "300, 225, 0.25, UNIFORM_WEAR, 1, 5000, 164.063, 0.0006",
    "300, 225, 0.25, UNIFORM_PRESSURE, 1, 5000, 165.179, 0.0006",
    "250, 175, 0.35, UNIFORM_WEAR, 2, 7200, 535.5000, 0.0002",
    "250, 175, 0.35, UNIFORM_PRESSURE, 2, 7200, 541.05875, 0.0002",
    "250, 175, 0.30, UNIFORM_WEAR, 1, 4000, 127.5, 0.05",
    "250, 175, 0.30, UNIFORM_PRESSURE, 1, 4000, 128.8, 0.05"
  })
  void theForceThatATorqueNeeds(
      double outer,
      double inner,
      double friction,
      FacePressure pressure,
      int faces,
      double force,
      double torque,
      double digits) {
    PlateBuild build = clutch(outer, inner, friction, pressure, faces, torque);
    assertThat(build.preloadForce()).isCloseTo(force, within(force * digits / torque));
  }

  /**
   * Shigley, problem 16-17 (from memory, recomputed): 6.5 in outer diameter, friction 0.24, 120
   * psi, 6 planes, uniform wear; torque in lbf·in over the inner diameter in inches.
   */
  @ParameterizedTest
  @CsvSource({"2, 5191", "3, 6769", "4, 7125", "5, 5853", "6, 2545"})
  void theBestInnerDiameter(double inner, double torque) {
    double pressure = 120 * POUND_FORCE / (INCH * INCH);
    double force = Math.PI * pressure * inner * INCH * (6.5 - inner) * INCH / 2;
    PlateBuild build =
        clutch(
            6.5 * INCH * 1000,
            inner * INCH * 1000,
            0.24,
            FacePressure.UNIFORM_WEAR,
            6,
            torque * POUND_FORCE * INCH);
    assertThat(build.preloadForce()).isCloseTo(force, within(force * 0.5 / torque));
  }

  /**
   * Ramp statics, our derivation: friction 0.11, 12 faces, 47 mm on 40 mm, no ramp friction;
   * locking value over ramp angle.
   */
  @ParameterizedTest
  @CsvSource({"30, 1.343", "45, 0.776", "60, 0.448", "75, 0.208", "80, 0.137", "90, 0"})
  void theLockingValueOfARampAngle(double degrees, double value) {
    PlateHardware hardware =
        new PlateHardware(0.053, 0.041, 0.11, 0.040, 0, FacePressure.UNIFORM_WEAR);
    RingSet rings = new RingSet("test", Math.toRadians(degrees), Math.PI / 2, true);
    PlateDifferential law = new PlateBuild(hardware, rings, false, 6, 0).law();
    assertThat(law.driveShare()).isCloseTo(value, within(5e-4));
    assertThat(law.coastShare()).isZero();
    PlateDifferential turned = new PlateBuild(hardware, rings, true, 6, 0).law();
    assertThat(turned.coastShare()).isEqualTo(law.driveShare());
    assertThat(turned.driveShare()).isZero();
  }

  /** A ramp whose friction angle fills the rest of the right angle does not press at all. */
  @Test
  void rampFrictionTakesFromTheLock() {
    RingSet rings = new RingSet("test", Math.toRadians(45), Math.toRadians(86), false);
    PlateHardware hardware =
        new PlateHardware(
            0.053, 0.041, 0.11, 0.040, Math.tan(Math.toRadians(5)), FacePressure.UNIFORM_WEAR);
    PlateDifferential law = new PlateBuild(hardware, rings, false, 6, 0).law();
    // cot(45 + 5 degrees) = 0.8391
    assertThat(law.driveShare()).isCloseTo(0.7755 * 0.8391, within(1e-4));
    assertThat(law.coastShare()).isZero();
  }

  /**
   * Public page on locks with a constant friction torque: the locking value falls as the load
   * rises, {@code S = T0/T}.
   */
  @Test
  void theLockingValueOfPreloadAloneFallsWithTheLoad() {
    PlateDifferential law = new PlateDifferential(100, 0, 0);
    for (double torque : new double[] {200, 400, 800}) {
      assertThat(law.capacity(torque) / torque).isCloseTo(100 / torque, within(1e-12));
    }
  }

  /**
   * Locking value and torque ratio of printed tables: 25 % is 1.67, 40 % is 2.33; 50 % shares 75 to
   * 25.
   */
  @ParameterizedTest
  @CsvSource({"0.25, 1.67", "0.40, 2.33", "0.50, 3.0", "0.60, 4.0", "0.75, 7.0", "0.05, 1.105"})
  void theTorquesOfALockingValue(double share, double ratio) {
    double torque = 600;
    double difference = new PlateDifferential(0, share, 0).capacity(torque);
    double slow = (torque + difference) / 2;
    double fast = (torque - difference) / 2;
    assertThat(slow / fast).isCloseTo(ratio, within(0.005));
    assertThat(slow / torque).isCloseTo((1 + share) / 2, within(1e-12));
  }

  /**
   * Bench check, from the balance of the two outputs: with the propshaft free they carry opposite
   * torques, so half the difference turns the free wheel, and that is the torque of one pack.
   */
  @Test
  void withThePropshaftFreeTheBenchShowsOnePack() {
    PlateBuild build = clutch(104, 72, 0.11, FacePressure.UNIFORM_WEAR, 6, 30);
    double difference = build.law().capacity(0);
    assertThat(difference).isEqualTo(60);
    assertThat(build.law().breakawayWheelHeld()).isEqualTo(difference / 2);
    double onePack =
        build.facesPerSide()
            * build.hardware().plateFriction()
            * build.hardware().effectiveRadius()
            * build.preloadForce();
    assertThat(build.law().breakawayWheelHeld()).isCloseTo(onePack, within(1e-12));
  }

  /**
   * With the propshaft locked and one wheel in the air the other takes the whole difference, and
   * its reaction is a cage torque: negative when the wheel is turned forwards. Without ramps the
   * two ways of measuring differ by a factor of two, with ramps by more.
   */
  @Test
  void withThePropshaftLockedTheReactionLoadsTheRamps() {
    PlateDifferential law = new PlateDifferential(60, 0.6, 0.25);
    double forwards = law.breakawayPropshaftLocked(true);
    double backwards = law.breakawayPropshaftLocked(false);
    assertThat(forwards)
        .isCloseTo(80, within(1e-12))
        .isCloseTo(law.capacity(-forwards), within(1e-12));
    assertThat(backwards)
        .isCloseTo(150, within(1e-12))
        .isCloseTo(law.capacity(backwards), within(1e-12));
    PlateDifferential noRamps = new PlateDifferential(60, 0, 0);
    assertThat(noRamps.breakawayPropshaftLocked(true)).isEqualTo(2 * noRamps.breakawayWheelHeld());
    assertThat(new PlateDifferential(60, 1, 0).breakawayPropshaftLocked(false)).isInfinite();
  }
}
