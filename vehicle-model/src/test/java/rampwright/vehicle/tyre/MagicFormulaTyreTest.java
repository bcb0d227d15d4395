package rampwright.vehicle.tyre;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.vehicle.input.InvalidInput;

class MagicFormulaTyreTest {
  private static final MagicFormulaTyre PRINTED = PublishedMagicTyres.secondEdition();

  private static TyreForces at(Tyre tyre, double load, double slip, double angle, double grip) {
    TyreForces out = new TyreForces();
    tyre.evaluate(load, slip, angle, grip, out);
    return out;
  }

  /**
   * Coefficients of Pacejka, 2nd ed. 2006, Table A3.1; forces computed from them by another program
   * and rounded to 0.1 N.
   */
  @ParameterizedTest
  @Tag("validation")
  @CsvSource({
    "2000, -2315.8, -1679.9, -114.5, 1543.8, 2275.6, 2434.8",
    "4000, -4681.1, -3553.5, -172.0, 3377.6, 4642.1, 4739.5",
    "6000, -7039.0, -5595.5, -145.3, 5472.0, 7020.2, 6890.8"
  })
  void pureLongitudinalForcesOfThePrintedSet(
      double load, double m10, double m5, double zero, double p5, double p10, double p20) {
    assertThat(at(PRINTED, load, -0.1, 0, 1).fx).isCloseTo(m10, within(0.051));
    assertThat(at(PRINTED, load, -0.05, 0, 1).fx).isCloseTo(m5, within(0.051));
    assertThat(at(PRINTED, load, 0, 0, 1).fx).isCloseTo(zero, within(0.051));
    assertThat(at(PRINTED, load, 0.05, 0, 1).fx).isCloseTo(p5, within(0.051));
    assertThat(at(PRINTED, load, 0.1, 0, 1).fx).isCloseTo(p10, within(0.051));
    assertThat(at(PRINTED, load, 0.2, 0, 1).fx).isCloseTo(p20, within(0.051));
  }

  /** As above, for side slip. */
  @ParameterizedTest
  @Tag("validation")
  @CsvSource({
    "2000, 2203.6, 1817.7, 918.3, 20.9, -855.0, -1672.0, -1988.3",
    "4000, 4069.9, 3292.1, 1608.4, 42.0, -1505.5, -3082.6, -3735.3",
    "6000, 5557.7, 4283.5, 1993.5, 57.3, -1873.2, -4090.4, -5207.4"
  })
  void pureLateralForcesOfThePrintedSet(
      double load,
      double m10,
      double m5,
      double m2,
      double zero,
      double p2,
      double p5,
      double p10) {
    assertThat(lateral(load, -10)).isCloseTo(m10, within(0.051));
    assertThat(lateral(load, -5)).isCloseTo(m5, within(0.051));
    assertThat(lateral(load, -2)).isCloseTo(m2, within(0.051));
    assertThat(lateral(load, 0)).isCloseTo(zero, within(0.051));
    assertThat(lateral(load, 2)).isCloseTo(p2, within(0.051));
    assertThat(lateral(load, 5)).isCloseTo(p5, within(0.051));
    assertThat(lateral(load, 10)).isCloseTo(p10, within(0.051));
  }

  private static double lateral(double load, double degrees) {
    return at(PRINTED, load, 0, Math.toRadians(degrees), 1).fy;
  }

  /** As above, both slips at once at 4000 N. */
  @ParameterizedTest
  @Tag("validation")
  @CsvSource({
    "3, 0.05, 2746.0, -1936.0",
    "5, 0.1, 3457.6, -2447.3",
    "-5, 0.1, 3704.8, 2707.9",
    "5, -0.1, -3486.6, -2720.2"
  })
  void combinedForcesOfThePrintedSet(double degrees, double slip, double fx, double fy) {
    TyreForces f = at(PRINTED, 4000, slip, Math.toRadians(degrees), 1);
    assertThat(f.fx).isCloseTo(fx, within(0.051));
    assertThat(f.fy).isCloseTo(fy, within(0.051));
  }

  static Stream<MagicFormulaTyre> tyres() {
    return Stream.of(
        PRINTED,
        PublishedMagicTyres.thirdEdition(),
        PRINTED.centred(),
        PublishedMagicTyres.thirdEdition().centred());
  }

  @ParameterizedTest
  @MethodSource("tyres")
  void thePartialsAreThoseOfFiniteDifferences(MagicFormulaTyre tyre) {
    for (double load : new double[] {1, 350, 2000, 4000, 9000, 60000}) {
      for (double slip : new double[] {-0.4, -0.06, 0.003, 0.1, 0.8}) {
        for (double angle : new double[] {-1.45, -0.3, -0.05, 0.004, 0.12, 0.9, 1.6}) {
          for (double grip : new double[] {1, 0.4}) {
            checkPartials(tyre, load, slip, angle, grip);
          }
        }
      }
    }
  }

  private static void checkPartials(
      Tyre tyre, double load, double slip, double angle, double grip) {
    TyreForces f = at(tyre, load, slip, angle, grip);
    double h = 1e-6;
    TyreForces up = at(tyre, load, slip + h, angle, grip);
    TyreForces down = at(tyre, load, slip - h, angle, grip);
    same(f.fxSlip, (up.fx - down.fx) / (2 * h), load);
    same(f.fySlip, (up.fy - down.fy) / (2 * h), load);
    up = at(tyre, load, slip, angle + h, grip);
    down = at(tyre, load, slip, angle - h, grip);
    same(f.fxAngle, (up.fx - down.fx) / (2 * h), load);
    same(f.fyAngle, (up.fy - down.fy) / (2 * h), load);
    double step = 1e-5 * load;
    up = at(tyre, load + step, slip, angle, grip);
    down = at(tyre, load - step, slip, angle, grip);
    same(f.fxLoad, (up.fx - down.fx) / (2 * step), 1);
    same(f.fyLoad, (up.fy - down.fy) / (2 * step), 1);
  }

  private static void same(double exact, double difference, double scale) {
    assertThat(exact).isCloseTo(difference, within(1e-6 * scale + 1e-6 * Math.abs(exact)));
  }

  @ParameterizedTest
  @MethodSource("tyres")
  void theCentredTyreHasNoForceWithoutSlipAndMirrors(MagicFormulaTyre tyre) {
    MagicFormulaTyre centred = tyre.centred();
    for (double load : new double[] {0, 500, 4000, 9000}) {
      TyreForces still = at(centred, load, 0, 0, 1);
      assertThat(still.fx).isZero();
      assertThat(still.fy).isZero();
      TyreForces left = at(centred, load, 0.07, 0.1, 0.8);
      TyreForces right = at(centred, load, 0.07, -0.1, 0.8);
      assertThat(right.fx).isEqualTo(left.fx);
      assertThat(right.fy).isEqualTo(-left.fy);
    }
  }

  @ParameterizedTest
  @MethodSource("tyres")
  void thePeaksLieWhereTheTyreSaysThem(MagicFormulaTyre tyre) {
    for (double load : new double[] {800, 4000, 7000}) {
      double slip = tyre.slipAtPeak(load);
      assertThat(at(tyre, load, slip, 0, 1).fxSlip).isCloseTo(0, within(1e-6 * load));
      double angle = tyre.slipAngleAtPeak(load);
      assertThat(Math.abs(at(tyre, load, 0, angle, 1).fyAngle)).isLessThan(1e-6 * load);
    }
  }

  @Test
  void anUnloadedWheelHasNoForceAndFinitePartials() {
    TyreForces f = at(PRINTED, 0, 0.1, -0.1, 1);
    assertThat(f.fx).isZero();
    assertThat(f.fy).isZero();
    assertThat(f.fxLoad).isBetween(0.5, 2.0);
    assertThat(f.fyLoad).isBetween(0.1, 2.0);
  }

  @Test
  void gripScalesFrictionAndNotStiffness() {
    MagicFormulaTyre tyre = PRINTED.centred();
    double slip = tyre.slipAtPeak(4000);
    assertThat(at(tyre, 4000, slip * 0.5, 0, 0.5).fx)
        .isCloseTo(0.5 * at(tyre, 4000, slip, 0, 1).fx, within(1e-6));
    assertThat(at(tyre, 4000, 0, 0, 0.5).fxSlip)
        .isCloseTo(at(tyre, 4000, 0, 0, 1).fxSlip, within(1e-6));
  }

  @Test
  void aSetWithOtherSignsIsRejected() {
    MagicLateral l = PRINTED.lateral();
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(
            () ->
                new MagicLateral(l.pCy1(), 0.99, 0, 0, 0, 0, 14.95, l.pKy2(), l.pKy4(), 0, 0, 0, 0))
        .withMessage(
            "The coefficient pKy1 (14.95) must be between -500 and -1. Maybe the signs are not"
                + " those of ISO 8855.");
  }
}
