package rampwright.vehicle.differential;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class DifferentialLawsTest {
  private static final PlateDifferential PLATE = new PlateDifferential(40, 0.3, 0.1);

  static Stream<Differential> laws() {
    return Stream.of(
        new OpenDifferential(0.08),
        PLATE,
        new RefinedPlateDifferential(PLATE, 0.05, PreloadPath.PARALLEL, friction(0.7)),
        new RefinedPlateDifferential(PLATE, 0, PreloadPath.SERIES, friction(1.2)),
        ViscousDifferential.newtonian(10.47),
        new ViscousDifferential(80, 3, 0.4),
        new TorqueSensingDifferential(20, 2.5, 1.6),
        new BrakeLock(0.03, 8000, 900));
  }

  private static PlateFriction friction(double ratio) {
    return new PlateFriction(ratio, 4, 140, 80, 0.002);
  }

  @ParameterizedTest
  @MethodSource("laws")
  void slopesAreThoseOfFiniteDifferences(Differential law) {
    double h = 1e-5;
    for (double torque : new double[] {-900, -50, 30, 700}) {
      assertThat(law.capacitySlope(torque))
          .isCloseTo((law.capacity(torque + h) - law.capacity(torque - h)) / (2 * h), within(1e-6));
    }
    for (double speed : new double[] {-30, -2, 0.4, 12}) {
      assertThat(law.viscousSlope(speed))
          .isCloseTo(
              (law.viscousTorque(speed + h) - law.viscousTorque(speed - h)) / (2 * h),
              within(1e-5));
      assertThat(law.slidingFactorSlope(speed))
          .isCloseTo(
              (law.slidingFactor(speed + h) - law.slidingFactor(speed - h)) / (2 * h),
              within(1e-6));
    }
    for (double[] s : new double[][] {{0.1, 0.02}, {0.3, 0.01}, {0.05, -0.2}, {-0.1, -0.4}}) {
      assertThat(law.wheelBrakeBySlip(s[0], s[1]))
          .isCloseTo(
              (law.wheelBrakeTorque(s[0] + h, s[1]) - law.wheelBrakeTorque(s[0] - h, s[1]))
                  / (2 * h),
              within(1e-3));
      assertThat(law.wheelBrakeByOtherSlip(s[0], s[1]))
          .isCloseTo(
              (law.wheelBrakeTorque(s[0], s[1] + h) - law.wheelBrakeTorque(s[0], s[1] - h))
                  / (2 * h),
              within(1e-3));
    }
  }

  @ParameterizedTest
  @MethodSource("laws")
  void noLawMovesTorqueToTheFasterOutput(Differential law) {
    for (double speed : new double[] {-20, -0.1, 0, 0.1, 20}) {
      assertThat(law.viscousTorque(speed) * speed >= 0).isTrue();
      assertThat(law.viscousTorque(-speed) + law.viscousTorque(speed)).isZero();
      assertThat(law.slidingFactor(speed)).isPositive();
    }
    for (double torque : new double[] {-500, 0, 500}) {
      assertThat(law.capacity(torque) >= 0).isTrue();
    }
    assertThat(law.slidingFactor(0)).isEqualTo(1);
  }

  /** Perantoni and Limebeer, Vehicle System Dynamics 52(5), 2014, equation 25 and Table 4. */
  @Test
  @Tag("validation")
  void theLinearViscousLawOfThePaper() {
    assertThat(ViscousDifferential.newtonian(10.47).viscousTorque(Math.PI / 30))
        .isCloseTo(1.096, within(5e-4));
  }

  /** Common practice, no source: a viscous unit answers to speed only, a plate unit to torque. */
  @Test
  void aViscousUnitAnswersToSpeedAndAPlateUnitToTorque() {
    ViscousDifferential viscous = new ViscousDifferential(80, 3, 0.4);
    assertThat(viscous.capacity(1000)).isEqualTo(viscous.capacity(0)).isZero();
    assertThat(viscous.viscousTorque(10)).isGreaterThan(viscous.viscousTorque(5));
    assertThat(PLATE.viscousTorque(10)).isZero();
    assertThat(PLATE.capacity(1000)).isGreaterThan(PLATE.capacity(0));
  }

  @Test
  void shearThinningTendsToItsPower() {
    ViscousDifferential law = new ViscousDifferential(80, 3, 0.4);
    assertThat(law.viscousTorque(6e5) / law.viscousTorque(3e5))
        .isCloseTo(Math.pow(2, 0.4), within(1e-6));
    assertThat(law.viscousSlope(0)).isEqualTo(80);
  }

  /** Locking values and bias ratios as public pages print them. */
  @ParameterizedTest
  @Tag("validation")
  @CsvSource({"1.67, 0.25, 0.002", "2.33, 0.40, 0.002", "3, 0.50, 1e-12", "3.5, 0.556, 5e-4"})
  void theLockingValueOfABiasRatio(double bias, double value, double digits) {
    TorqueSensingDifferential unit = new TorqueSensingDifferential(0, bias, 1);
    assertThat(unit.capacity(100) / 100).isCloseTo(value, within(digits));
    assertThat(unit.capacity(-100)).isZero();
    double slow = (1 + unit.capacity(1)) / 2;
    assertThat(slow / (1 - slow)).isCloseTo(bias, within(1e-9));
  }

  @Test
  void seriesPreloadIsOvercomeBeforeTheRampsWork() {
    RefinedPlateDifferential series =
        new RefinedPlateDifferential(PLATE, 0, PreloadPath.SERIES, PlateFriction.CONSTANT);
    assertThat(series.capacity(100)).isEqualTo(40);
    assertThat(series.capacity(200)).isEqualTo(60);
    RefinedPlateDifferential parallel =
        new RefinedPlateDifferential(PLATE, 0, PreloadPath.PARALLEL, PlateFriction.CONSTANT);
    assertThat(parallel.capacity(200)).isEqualTo(PLATE.capacity(200));
    assertThat(parallel.refines()).isFalse();
  }

  @Test
  void frictionFadesWithHeatAndFallsWhileSliding() {
    PlateFriction friction = friction(0.7);
    assertThat(friction.temperatureFactor()).isCloseTo(0.88, within(1e-12));
    assertThat(friction.slidingFactor(1e3)).isCloseTo(0.7, within(1e-12));
    assertThat(new PlateFriction(1, 1, 600, 20, 0.01).temperatureFactor()).isEqualTo(0.2);
  }

  /**
   * Neale, The Tribology Handbook, Table 7.4: sintered plates in oil, 0.10 static, 0.05 sliding.
   */
  @Test
  @Tag("validation")
  void sinteredPlatesInOilLoseHalfTheirFriction() {
    PlateFriction sintered = new PlateFriction(0.05 / 0.10, 2, 80, 80, 0);
    assertThat(0.10 * sintered.slidingFactor(0)).isEqualTo(0.10);
    assertThat(0.10 * sintered.slidingFactor(50)).isCloseTo(0.05, within(1e-9));
  }

  @Test
  void sideGearThrustAddsWhatItsAxialForceClamps() {
    PlateHardware hardware =
        new PlateHardware(0.052, 0.036, 0.11, 0.034, 0.08, FacePressure.UNIFORM_WEAR);
    SideGear gear = new SideGear(0.030, Math.toRadians(22.5), Math.toRadians(58));
    double torque = 400;
    double axial =
        torque / (2 * 0.030) * Math.tan(Math.toRadians(22.5)) * Math.sin(1.0122909661567);
    double difference = 2 * 6 * 0.11 * 0.044 * axial;
    assertThat(gear.share(hardware, 6) * torque).isCloseTo(difference, within(1e-6 * difference));
  }

  @Test
  void aBrakeLockWaitsForItsThresholdAndStopsAtItsLimit() {
    BrakeLock lock = new BrakeLock(0.03, 8000, 900);
    assertThat(lock.wheelBrakeTorque(0.04, 0.02)).isZero();
    assertThat(lock.wheelBrakeTorque(0.10, 0.02)).isCloseTo(400, within(1e-9));
    assertThat(lock.wheelBrakeTorque(0.40, 0.02)).isEqualTo(900);
    assertThat(lock.wheelBrakeTorque(-0.05, -0.4)).isZero();
  }
}
