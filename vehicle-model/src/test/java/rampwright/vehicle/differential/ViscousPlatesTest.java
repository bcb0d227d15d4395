package rampwright.vehicle.differential;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rampwright.vehicle.differential.ViscousPlates.Arrangement;

class ViscousPlatesTest {
  private static final double RPM = Math.PI / 30;

  private static ViscousPlates disc(double gapWidth) {
    return new ViscousPlates(0.15, 0, gapWidth, 1, Arrangement.OUTPUT_TO_OUTPUT);
  }

  /**
   * Cengel and Cimbala, Fluid Mechanics, problem 2-79 and its older edition (0.55 N·m printed, from
   * memory): oil-film clutch of 0.30 m diameter with 0.38 Pa·s. The other two are computed from the
   * same formula; a public solution of the second prints 0.151, which is its own arithmetic slip.
   */
  @ParameterizedTest
  @Tag("validation")
  @CsvSource({
    "0.003, 52, 0.55, 0.005",
    "0.003, 52, 0.54850, 5e-6",
    "0.002, 75, 1.18667, 5e-6",
    "0.002, 52, 0.82275, 5e-6"
  })
  void theOilFilmClutch(double gapWidth, double rpm, double torque, double digits) {
    assertThat(disc(gapWidth).shearCoefficient(0.38) * rpm * RPM).isCloseTo(torque, within(digits));
  }

  /** Maker's data sheet form, from memory: what is left of the viscosity at 25 °C. */
  @ParameterizedTest
  @Tag("validation")
  @CsvSource({"100, 0.306, 1e-3", "150, 0.176, 1e-3"})
  void theOilThinsWithHeat(double temperature, double ratio, double digits) {
    SiliconeOil oil = new SiliconeOil(12, 1e6, 1);
    assertThat(oil.viscosity(temperature) / 12).isCloseTo(ratio, within(digits));
    assertThat(oil.viscosity(25)).isCloseTo(12, within(0.05));
  }

  @Test
  void aRingShearsWhatTheDiscShearsWithoutItsMiddle() {
    double whole = disc(0.001).shearCoefficient(1);
    double middle =
        new ViscousPlates(0.09, 0, 0.001, 1, Arrangement.OUTPUT_TO_OUTPUT).shearCoefficient(1);
    ViscousPlates ring = new ViscousPlates(0.15, 0.09, 0.001, 7, Arrangement.OUTPUT_TO_OUTPUT);
    assertThat(ring.shearCoefficient(1)).isCloseTo(7 * (whole - middle), within(1e-9));
  }

  @Test
  void theTwoArrangementsDifferByWhatShearsAgainstWhat() {
    SiliconeOil oil = new SiliconeOil(10, 5000, 0.6);
    ViscousPlates direct = new ViscousPlates(0.06, 0.03, 3e-4, 40, Arrangement.OUTPUT_TO_OUTPUT);
    ViscousPlates toCase = new ViscousPlates(0.06, 0.03, 3e-4, 40, Arrangement.OUTPUTS_TO_CASE);
    double whole = direct.law(oil, 80).viscousTorque(10);
    // each side shears at half the speed difference
    assertThat(toCase.law(oil, 80).viscousTorque(20)).isCloseTo(whole, within(1e-9 * whole));
    assertThat(direct.law(oil, 80).coefficient())
        .isCloseTo(2 * direct.shearCoefficient(oil.viscosity(80)), within(1e-9));
  }
}
