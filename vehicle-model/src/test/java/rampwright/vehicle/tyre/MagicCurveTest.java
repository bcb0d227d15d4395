package rampwright.vehicle.tyre;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The curve against Bakker, Nyborg and Pacejka, Tyre modelling for use in vehicle dynamics studies,
 * SAE 870421, 1987, Tables 2 and 3: coefficients as ten public transcriptions have them, forces
 * computed from them in double precision by another program.
 */
class MagicCurveTest {
  /** B, C, D, E of the side force at a load in kN, slip angles in degrees. */
  private static double[] side(double load) {
    double c = 1.30;
    double d = -22.1 * load * load + 1011 * load;
    double stiffness = 1078 * Math.sin(1.82 * Math.atan(0.208 * load));
    return new double[] {stiffness / (c * d), c, d, -0.354 * load + 0.707};
  }

  /** B, C, D, E of the brake force at a load in kN, slip in percent. */
  private static double[] brake(double load) {
    double c = 1.65;
    double d = -21.3 * load * load + 1144 * load;
    double stiffness = (49.6 * load * load + 226 * load) / Math.exp(0.069 * load);
    double e = -0.006 * load * load + 0.056 * load + 0.486;
    return new double[] {stiffness / (c * d), c, d, e};
  }

  /** B, C, D, E of the aligning moment at a load in kN, slip angles in degrees. */
  private static double[] moment(double load) {
    double c = 2.40;
    double d = -2.72 * load * load - 2.28 * load;
    double stiffness = (-1.86 * load * load - 2.73 * load) / Math.exp(0.110 * load);
    double e = -0.070 * load * load + 0.643 * load - 4.04;
    return new double[] {stiffness / (c * d), c, d, e};
  }

  private static double value(double[] k, double x) {
    return MagicCurve.value(k[0], k[1], k[2], k[3], x);
  }

  private static double peak(double[] k) {
    return MagicCurve.peak(k[1], k[3], 100) / k[0];
  }

  @ParameterizedTest
  @Tag("validation")
  @CsvSource({
    "2, 9.346, 676.3, 1197.1, 1722.5, 1885.9, 1932.8, 1905.9",
    "4, 9.351, 1009.4, 1911.1, 3096.6, 3553.5, 3688.3, 3622.3",
    "6, 10.824, 1072.0, 2110.4, 3833.1, 4794.4, 5264.6, 5206.7",
    "8, 12.777, 1029.9, 2061.0, 4011.2, 5464.5, 6576.2, 6646.8"
  })
  void theSideForceOf1987(
      double load,
      double peak,
      double at1,
      double at2,
      double at4,
      double at6,
      double at10,
      double at15) {
    double[] k = side(load);
    assertThat(peak(k)).isCloseTo(peak, within(5e-4));
    assertThat(value(k, 1)).isCloseTo(at1, within(0.051));
    assertThat(value(k, 2)).isCloseTo(at2, within(0.051));
    assertThat(value(k, 4)).isCloseTo(at4, within(0.051));
    assertThat(value(k, 6)).isCloseTo(at6, within(0.051));
    assertThat(value(k, 10)).isCloseTo(at10, within(0.051));
    assertThat(value(k, 15)).isCloseTo(at15, within(0.051));
  }

  @ParameterizedTest
  @Tag("validation")
  @CsvSource({
    "2, 11.857, 1037.5, 1878.1, 2191.8, 2121.4, 1779.0, 1530.8",
    "4, 10.348, 2281.8, 3823.7, 4234.4, 4014.8, 3354.2, 2898.6",
    "6, 9.181, 3580.8, 5687.1, 6090.6, 5667.0, 4691.8, 4071.7",
    "8, 8.135, 4852.9, 7429.8, 7736.3, 7027.2, 5746.1, 5023.3"
  })
  void theBrakeForceOf1987(
      double load,
      double peak,
      double at2,
      double at5,
      double at10,
      double at20,
      double at50,
      double at100) {
    double[] k = brake(load);
    assertThat(peak(k)).isCloseTo(peak, within(5e-4));
    assertThat(value(k, 2)).isCloseTo(at2, within(0.051));
    assertThat(value(k, 5)).isCloseTo(at5, within(0.051));
    assertThat(value(k, 10)).isCloseTo(at10, within(0.051));
    assertThat(value(k, 20)).isCloseTo(at20, within(0.051));
    assertThat(value(k, 50)).isCloseTo(at50, within(0.051));
    assertThat(value(k, 100)).isCloseTo(at100, within(0.051));
  }

  @ParameterizedTest
  @Tag("validation")
  @CsvSource({
    "2, 2.121, -10.0, -15.4, -7.5, -0.3, 4.7, 6.6",
    "4, 2.931, -25.6, -45.8, -45.8, -21.3, 5.7, 16.9",
    "6, 3.754, -42.6, -80.7, -111.0, -78.8, -10.7, 23.8",
    "8, 4.597, -58.2, -114.0, -187.9, -172.2, -54.4, 22.9"
  })
  void theAligningMomentOf1987(
      double load,
      double peak,
      double at1,
      double at2,
      double at4,
      double at6,
      double at10,
      double at15) {
    double[] k = moment(load);
    assertThat(peak(k)).isCloseTo(peak, within(5e-4));
    assertThat(value(k, 1)).isCloseTo(at1, within(0.051));
    assertThat(value(k, 2)).isCloseTo(at2, within(0.051));
    assertThat(value(k, 4)).isCloseTo(at4, within(0.051));
    assertThat(value(k, 6)).isCloseTo(at6, within(0.051));
    assertThat(value(k, 10)).isCloseTo(at10, within(0.051));
    assertThat(value(k, 15)).isCloseTo(at15, within(0.051));
  }

  @Test
  void theCurveHasItsNamedProperties() {
    double[] k = brake(5);
    assertThat(value(k, 1e-7) / 1e-7).isCloseTo(k[0] * k[1] * k[2], within(1e-3));
    assertThat(value(k, peak(k))).isCloseTo(k[2], within(1e-9));
    assertThat(value(k, 1e9)).isCloseTo(k[2] * Math.sin(k[1] * Math.PI / 2), within(1e-3));
    assertThat(value(k, -7)).isEqualTo(-value(k, 7));
  }

  @Test
  void aCurveWithoutAPeakIsCutOff() {
    assertThat(MagicCurve.peak(0.9, 0, 7)).isEqualTo(7);
    assertThat(MagicCurve.peak(1.2, 1, 7)).isEqualTo(7);
    assertThat(MagicCurve.peak(1.2, 0, 7)).isCloseTo(Math.tan(Math.PI / 2.4), within(1e-12));
  }
}
