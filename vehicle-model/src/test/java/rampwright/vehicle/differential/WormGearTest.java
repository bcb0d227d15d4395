package rampwright.vehicle.differential;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WormGearTest {
  private static WormGear gear(double leadDegrees, double pressureDegrees, double friction) {
    return new WormGear(Math.toRadians(leadDegrees), Math.toRadians(pressureDegrees), friction);
  }

  /** Shigley, Mechanical Engineering Design, efficiency of worm gearsets for f = 0.05; memory. */
  @ParameterizedTest
  @Tag("validation")
  @CsvSource({
    "1, 25.2",
    "2.5, 45.7",
    "5, 62.6",
    "7.5, 71.3",
    "10, 76.6",
    "15, 82.7",
    "20, 85.9",
    "30, 89.1"
  })
  void theEfficienciesOfTheTable(double leadDegrees, double percent) {
    assertThat(100 * gear(leadDegrees, 14.5, 0.05).efficiency()).isCloseTo(percent, within(0.06));
  }

  /** Carvill, Mechanical Engineer's Data Handbook, p. 99: both efficiencies in his own form. */
  @ParameterizedTest
  @Tag("validation")
  @CsvSource({"12, 20, 0.06", "35, 25, 0.12", "45, 14.5, 0.03"})
  void theEfficienciesInTheHandbooksForm(double lead, double pressure, double f) {
    WormGear gear = gear(lead, pressure, f);
    double cos = Math.cos(Math.toRadians(pressure));
    double tan = Math.tan(Math.toRadians(lead));
    assertThat(gear.efficiency()).isCloseTo((cos - f * tan) / (cos + f / tan), within(1e-12));
    assertThat(gear.backDriveEfficiency())
        .isCloseTo((cos - f / tan) / (cos + f * tan), within(1e-12));
  }

  /** Self-locking from f = cos(phi_n) tan(lambda) on, as the handbook has it. */
  @Test
  @Tag("validation")
  void belowTheFrictionAngleTheGearDoesNotDriveTheWorm() {
    double limit = Math.cos(Math.toRadians(20)) * Math.tan(Math.toRadians(6));
    assertThat(gear(6, 20, limit * 1.001).selfLocking()).isTrue();
    assertThat(gear(6, 20, limit * 0.999).selfLocking()).isFalse();
    assertThat(gear(6, 20, limit * 1.001).biasRatio()).isInfinite();
    assertThat(gear(6, 20, limit * 1.001).law(0)).isEqualTo(new Spool());
  }

  @Test
  void theBiasRatioGrowsWithFrictionFromOne() {
    assertThat(gear(35, 20, 0).biasRatio()).isCloseTo(1, within(1e-12));
    double bias = gear(35, 20, 0.12).biasRatio();
    assertThat(bias).isBetween(1.5, 2.5);
    assertThat(gear(35, 20, 0.12).law(15)).isEqualTo(new TorqueSensingDifferential(15, bias, bias));
  }
}
