package rampwright.vehicle.tyre;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.differentiation.DerivativeStructure;
import org.apache.commons.math3.analysis.differentiation.FiniteDifferencesDifferentiator;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rampwright.vehicle.input.InvalidInput;

class PeakSlipTyreTest {
  private static final PeakAtLoad LIGHT = new PeakAtLoad(2000, 1.75, 1.80, 0.11, Math.toRadians(9));
  private static final PeakAtLoad HEAVY = new PeakAtLoad(6000, 1.40, 1.45, 0.10, Math.toRadians(8));
  private static final PeakSlipTyre RACING =
      new PeakSlipTyre(LIGHT, HEAVY, SlipCurve.peakAtOne(1.9), SlipCurve.peakAtOne(1.7));

  private static TyreForces at(Tyre tyre, double load, double slip, double slipAngle) {
    TyreForces out = new TyreForces();
    tyre.evaluate(load, slip, slipAngle, 1, out);
    return out;
  }

  /**
   * Perantoni and Limebeer, Vehicle System Dynamics 52(5), 2014, Appendix A, Table 3, with the
   * curve of the public transcriptions, {@code S = pi/(2 atan Q)}; force values computed apart from
   * this project from those numbers, to their last printed digit.
   */
  @ParameterizedTest(name = "{0} N, {1} deg, slip {2}")
  @Tag("validation")
  @CsvSource({
    "1000, 0, 0.05, 1625.14, 0",
    "1000, 4, 0, 0, 1648.17",
    "2000, 0, 0.05, 3126.78, 0",
    "2000, 0, 0.105, 3413.76, 0",
    "2000, 8.5, 0, 0, 3518.77",
    "2000, 4, 0.05, 2471.18, 2485.30",
    "4000, 0, 0.05, 5739.34, 0",
    "4000, 4, 0.05, 4454.28, 4541.62",
    "6000, 0, 0.105, 8006.98, 0",
    "6000, 4, 0.05, 5929.90, 6141.68"
  })
  void thePublishedRacingTyreIsReproduced(
      double load, double degrees, double slip, double fx, double fy) {
    SlipCurve published = new SlipCurve(1.9, Math.PI / (2 * Math.atan(1.9)));
    PeakSlipTyre tyre = new PeakSlipTyre(LIGHT, HEAVY, published, published);
    // the paper's slip angle has the sign of the force, ISO 8855 the opposite
    TyreForces f = at(tyre, load, slip, -Math.toRadians(degrees));
    assertThat(f.fx).isCloseTo(fx, within(0.005));
    assertThat(f.fy).isCloseTo(fy, within(0.005));
  }

  /**
   * The same transcription peaks early: {@code tan(pi/3.8)/1.445982}. A public file carries it as
   * the constant 0.751247350722835, good to seven digits.
   */
  @Test
  @Tag("validation")
  void thePublishedCurvePeaksAtThreeQuartersOfItsTabulatedSlip() {
    SlipCurve published = new SlipCurve(1.9, Math.PI / (2 * Math.atan(1.9)));
    assertThat(published.peak()).isCloseTo(0.7512472, within(5e-8));
    assertThat(published.value(1)).isCloseTo(0.965321, within(5e-7));
    assertThat(published.value(published.peak())).isCloseTo(1, within(1e-14));
  }

  @ParameterizedTest
  @CsvSource({"1.05", "1.3", "1.6", "1.9", "1.99"})
  void theDefaultCurvePeaksAtOneWithTheValueOne(double shape) {
    SlipCurve curve = SlipCurve.peakAtOne(shape);
    assertThat(curve.peak()).isCloseTo(1, within(1e-14));
    assertThat(curve.value(1)).isCloseTo(1, within(1e-14));
    assertThat(curve.value(0.98)).isLessThan(1);
    assertThat(curve.value(1.02)).isLessThan(1);
  }

  @Test
  void theEnteredPeaksComeBack() {
    for (PeakAtLoad entered : new PeakAtLoad[] {LIGHT, HEAVY}) {
      double load = entered.load();
      TyreForces drive = at(RACING, load, entered.slip(), 0);
      assertThat(drive.fx).isCloseTo(entered.frictionX() * load, within(1e-9));
      assertThat(drive.fxSlip).isCloseTo(0, within(1e-6));
      TyreForces side = at(RACING, load, 0, -entered.slipAngle());
      assertThat(side.fy).isCloseTo(entered.frictionY() * load, within(1e-9));
      assertThat(side.fyAngle).isCloseTo(0, within(1e-6));
      assertThat(RACING.slipAtPeak(load)).isCloseTo(entered.slip(), within(1e-14));
      assertThat(RACING.slipAngleAtPeak(load)).isCloseTo(entered.slipAngle(), within(1e-14));
    }
  }

  @Test
  void frictionAndSlipAtThePeakStopAtTheirFloors() {
    double heavy = 40_000;
    double slip = PeakSlipTyre.LEAST_SLIP;
    assertThat(RACING.slipAtPeak(heavy)).isEqualTo(slip);
    assertThat(at(RACING, heavy, slip, 0).fx)
        .isCloseTo(PeakSlipTyre.LEAST_FRICTION * heavy, within(1e-6));
    assertThat(at(RACING, heavy, 0, -PeakSlipTyre.LEAST_SLIP).fy)
        .isCloseTo(PeakSlipTyre.LEAST_FRICTION * heavy, within(1e-6));
  }

  @Test
  void aWheelInTheAirCarriesNothing() {
    TyreForces f = at(RACING, 0, 0.07, -0.1);
    assertThat(f.fx).isZero();
    assertThat(f.fy).isZero();
  }

  /** Five-point differences of Commons Math as the second opinion on every partial. */
  @ParameterizedTest(name = "{0} N, slip {1}, {2} rad")
  @CsvSource({
    "3000, 0, 0",
    "3000, 1e-5, -2e-5",
    "3000, 0.04, 0",
    "3000, -0.04, 0.03",
    "900, 0.1, -0.2",
    "5200, 0.3, 0.02",
    "7000, -0.6, -0.4",
    "21000, 0.02, 0.01",
    "2000, 0, -0.157"
  })
  void everyPartialIsTheDerivative(double load, double slip, double angle) {
    TyreForces f = at(RACING, load, slip, angle);
    double scale = 2 * load;
    check(f.fxSlip, s -> at(RACING, load, s, angle).fx, slip, 1e-4, scale);
    check(f.fySlip, s -> at(RACING, load, s, angle).fy, slip, 1e-4, scale);
    check(f.fxAngle, a -> at(RACING, load, slip, a).fx, angle, 1e-4, scale);
    check(f.fyAngle, a -> at(RACING, load, slip, a).fy, angle, 1e-4, scale);
    check(f.fxLoad, n -> at(RACING, n, slip, angle).fx, load, 1, 1);
    check(f.fyLoad, n -> at(RACING, n, slip, angle).fy, load, 1, 1);
  }

  private static void check(
      double partial, DoubleUnaryOperator force, double x, double step, double scale) {
    double difference =
        new FiniteDifferencesDifferentiator(5, step)
            .differentiate(force::applyAsDouble)
            .value(new DerivativeStructure(1, 1, 0, x))
            .getPartialDerivative(1);
    assertThat(partial).isCloseTo(difference, within(1e-5 * scale));
  }

  @Test
  void loadsInTheWrongOrderAreRejected() {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(
            () ->
                new PeakSlipTyre(HEAVY, LIGHT, SlipCurve.peakAtOne(1.5), SlipCurve.peakAtOne(1.5)))
        .withMessageContaining("2000")
        .withMessageContaining("must be above the first load of 6000");
  }
}
