package rampwright.vehicle.tyre;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.DoubleRange;

@Tag("property")
class PeakSlipTyrePropertyTest {
  @Provide
  Arbitrary<PeakSlipTyre> tyres() {
    Arbitrary<PeakAtLoad> light = peaks(800, 2500);
    Arbitrary<PeakAtLoad> heavy = peaks(2600, 9000);
    Arbitrary<SlipCurve> curves =
        Arbitraries.doubles().between(1.05, 1.95).map(SlipCurve::peakAtOne);
    return Combinators.combine(light, heavy, curves, curves).as(PeakSlipTyre::new);
  }

  private static Arbitrary<PeakAtLoad> peaks(double least, double most) {
    Arbitrary<Double> friction = Arbitraries.doubles().between(0.3, 2.2);
    return Combinators.combine(
            Arbitraries.doubles().between(least, most),
            friction,
            friction,
            Arbitraries.doubles().between(0.03, 0.3),
            Arbitraries.doubles().between(2.0, 15.0).map(Math::toRadians))
        .as(PeakAtLoad::new);
  }

  private static TyreForces at(Tyre tyre, double load, double slip, double angle, double grip) {
    TyreForces out = new TyreForces();
    tyre.evaluate(load, slip, angle, grip, out);
    return out;
  }

  @Property
  void mirroredSlipGivesMirroredForces(
      @ForAll("tyres") PeakSlipTyre tyre,
      @ForAll @DoubleRange(max = 9000) double load,
      @ForAll @DoubleRange(min = -1, max = 1) double slip,
      @ForAll @DoubleRange(min = -0.6, max = 0.6) double angle) {
    TyreForces f = at(tyre, load, slip, angle, 1);
    TyreForces side = at(tyre, load, slip, -angle, 1);
    TyreForces back = at(tyre, load, -slip, angle, 1);
    assertThat(side.fx).isEqualTo(f.fx);
    assertThat(side.fy).isEqualTo(-f.fy);
    assertThat(back.fx).isEqualTo(-f.fx);
    assertThat(back.fy).isEqualTo(f.fy);
  }

  /** With one curve for both directions the force cannot leave the friction ellipse. */
  @Property
  void theForceStaysWithinTheFrictionEllipse(
      @ForAll("tyres") PeakSlipTyre any,
      @ForAll @DoubleRange(min = 1, max = 9000) double load,
      @ForAll @DoubleRange(min = -1, max = 1) double slip,
      @ForAll @DoubleRange(min = -0.6, max = 0.6) double angle) {
    PeakSlipTyre tyre = new PeakSlipTyre(any.light(), any.heavy(), any.lateral(), any.lateral());
    double limitX = at(tyre, load, tyre.slipAtPeak(load), 0, 1).fx;
    double limitY = at(tyre, load, 0, -tyre.slipAngleAtPeak(load), 1).fy;
    TyreForces f = at(tyre, load, slip, angle, 1);
    assertThat(Math.hypot(f.fx / limitX, f.fy / limitY)).isLessThanOrEqualTo(1 + 1e-12);
  }

  @Property
  void gripScalesForcesAndPartials(
      @ForAll("tyres") PeakSlipTyre tyre,
      @ForAll @DoubleRange(max = 9000) double load,
      @ForAll @DoubleRange(min = -1, max = 1) double slip,
      @ForAll @DoubleRange(min = -0.6, max = 0.6) double angle,
      @ForAll @DoubleRange(min = 0.05, max = 2) double grip) {
    TyreForces f = at(tyre, load, slip, angle, 1);
    TyreForces g = at(tyre, load, slip, angle, grip);
    assertThat(g.fx).isCloseTo(grip * f.fx, within(1e-9 * (1 + load)));
    assertThat(g.fy).isCloseTo(grip * f.fy, within(1e-9 * (1 + load)));
    assertThat(g.fxSlip).isCloseTo(grip * f.fxSlip, within(1e-7 * (1 + load)));
    assertThat(g.fyLoad).isCloseTo(grip * f.fyLoad, within(1e-9));
  }

  /** Power that the contact patch turns into heat; the tyre never drives itself. */
  @Property
  void slidingAlwaysCostsPower(
      @ForAll("tyres") PeakSlipTyre tyre,
      @ForAll @DoubleRange(max = 9000) double load,
      @ForAll @DoubleRange(min = -1, max = 1) double slip,
      @ForAll @DoubleRange(min = -0.6, max = 0.6) double angle) {
    TyreForces f = at(tyre, load, slip, angle, 1);
    assertThat(f.fx * slip - f.fy * Math.tan(angle)).isGreaterThanOrEqualTo(0);
  }

  /** The series near zero slip and the full expression meet where one hands over to the other. */
  @Property
  void nothingJumpsAtTheHandOverNearZeroSlip(
      @ForAll("tyres") PeakSlipTyre tyre,
      @ForAll @DoubleRange(min = 100, max = 9000) double load,
      @ForAll @DoubleRange(max = 6.28) double direction) {
    double s = tyre.slipAtPeak(load) * Math.cos(direction);
    double a = -tyre.slipAngleAtPeak(load) * Math.sin(direction);
    TyreForces below = at(tyre, load, 0.9999999e-3 * s, 0.9999999e-3 * a, 1);
    TyreForces above = at(tyre, load, 1.0000001e-3 * s, 1.0000001e-3 * a, 1);
    double stiffness = Math.abs(at(tyre, load, 0, 0, 1).fxSlip);
    assertThat(above.fx).isCloseTo(below.fx, within(1e-6 * Math.abs(below.fx) + 1e-9));
    assertThat(above.fy).isCloseTo(below.fy, within(1e-6 * Math.abs(below.fy) + 1e-9));
    assertThat(above.fxSlip).isCloseTo(below.fxSlip, within(2e-5 * stiffness));
  }
}
