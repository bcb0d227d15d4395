package rampwright.vehicle.circuit.survey;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SmoothingTest {
  private static final int N = 2400;

  private static double[] wave(double wavelength) {
    double[] wave = new double[N];
    Arrays.setAll(wave, i -> Math.cos(2 * Math.PI * i / wavelength));
    return wave;
  }

  /**
   * Response of the Gaussian of fourth order to a wave: {@code (1 + q) exp(-q)} with {@code q}
   * inversely proportional to the wavelength squared (transform of the kernel, closed form).
   */
  @ParameterizedTest
  @CsvSource({"20, 0.5", "40, 0.933120", "60, 0.984630", "10, 0.009369"})
  @Tag("validation")
  void aWaveKeepsTheShareOfItsLength(double wavelength, double share) {
    double q = 1.6783469900166605 * Math.pow(20 / wavelength, 2);
    assertThat((1 + q) * Math.exp(-q)).isCloseTo(share, within(1e-6));
    double[] smooth = Smoothing.smooth(wave(wavelength), true, 1, 20);
    double[] wave = wave(wavelength);
    for (int i = 0; i < N; i++) {
      assertThat(smooth[i]).isCloseTo(share * wave[i], within(2e-6));
    }
  }

  @Test
  void aCubicCurveIsKeptAwayFromTheEnds() {
    double[] cubic = new double[200];
    Arrays.setAll(cubic, i -> Math.pow((i - 100) / 50.0, 3));
    double[] smooth = Smoothing.smooth(cubic, false, 1, 20);
    for (int i = 60; i < 140; i++) {
      assertThat(smooth[i]).isCloseTo(cubic[i], within(1e-5));
    }
  }

  @Test
  void aStraightLineIsKeptToItsEnds() {
    double[] line = new double[100];
    Arrays.setAll(line, i -> 3 - 0.1 * i);
    double[] smooth = Smoothing.smooth(line, false, 1, 20);
    assertThat(smooth).containsExactly(line, within(1e-12));
  }

  @Test
  void noLengthMeansNoSmoothing() {
    assertThat(Smoothing.smooth(wave(7), true, 1, 0)).isEqualTo(wave(7));
  }
}
