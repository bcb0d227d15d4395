package rampwright.vehicle.chassis;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Assume;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.DoubleRange;

@Tag("property")
class WheelLoadsPropertyTest {
  private static final double G = WheelLoads.GRAVITY;
  private static final double FRONT_DOWN = 900;
  private static final double REAR_DOWN = 1400;

  @Provide
  Arbitrary<Chassis> chassis() {
    Arbitrary<double[]> sizes =
        Combinators.combine(
                Arbitraries.doubles().between(300, 2500),
                Arbitraries.doubles().between(1.6, 3.4),
                Arbitraries.doubles().between(0.35, 0.65),
                Arbitraries.doubles().between(0.1, 1.0))
            .as((m, l, share, h) -> new double[] {m, l, share, h});
    Arbitrary<double[]> roll =
        Combinators.combine(
                Arbitraries.doubles().between(1.1, 2.0),
                Arbitraries.doubles().between(1.1, 2.0),
                Arbitraries.doubles().between(-0.1, 0.3),
                Arbitraries.doubles().between(-0.1, 0.3),
                Arbitraries.doubles().between(0.0, 1.0))
            .as((tf, tr, hf, hr, share) -> new double[] {tf, tr, hf, hr, share});
    return Combinators.combine(sizes, roll)
        .as(
            (s, r) ->
                new Chassis(s[0], 1500, s[1], s[2] * s[1], s[3], r[0], r[1], r[2], r[3], r[4]));
  }

  private static WheelLoads loads(Chassis chassis, double fx, double fy) {
    WheelLoads loads = new WheelLoads(chassis);
    loads.update(fx, fy, G, 0, FRONT_DOWN, 0, REAR_DOWN, 0);
    return loads;
  }

  private static double rollMoment(Chassis c, WheelLoads w) {
    return (w.load(1) - w.load(0)) / 2 * c.trackFront()
        + (w.load(3) - w.load(2)) / 2 * c.trackRear();
  }

  @Property
  void theLoadsAddUpAndNoWheelPullsTheRoad(
      @ForAll("chassis") Chassis c,
      @ForAll @DoubleRange(min = -25, max = 25) double fx,
      @ForAll @DoubleRange(min = -25, max = 25) double fy) {
    WheelLoads w = loads(c, fx, fy);
    double weight = c.mass() * G + FRONT_DOWN + REAR_DOWN;
    double sum = 0;
    for (int i = 0; i < 4; i++) {
      assertThat(w.load(i)).isGreaterThanOrEqualTo(-1e-9 * weight);
      sum += w.load(i);
    }
    assertThat(sum).isCloseTo(weight, within(1e-9 * weight));
  }

  @Property
  void theLoadsCarryTheRollMomentUnlessTheCarIsOnTwoWheels(
      @ForAll("chassis") Chassis c,
      @ForAll @DoubleRange(min = -8, max = 8) double fx,
      @ForAll @DoubleRange(min = -25, max = 25) double fy) {
    WheelLoads w = loads(c, fx, fy);
    double moment = c.mass() * fy * c.cgHeight();
    double weight = c.mass() * G + FRONT_DOWN + REAR_DOWN;
    double inner = fy > 0 ? w.load(0) + w.load(2) : w.load(1) + w.load(3);
    if (inner > 0.01 * weight) {
      assertThat(rollMoment(c, w)).isCloseTo(moment, within(1e-9 * weight));
    } else {
      assertThat(Math.abs(rollMoment(c, w)))
          .isLessThanOrEqualTo(Math.abs(moment) * (1 + 1e-9) + 1e-9 * weight);
    }
  }

  @Property
  void aLeftTurnIsTheMirrorImageOfARightTurn(
      @ForAll("chassis") Chassis c,
      @ForAll @DoubleRange(min = -25, max = 25) double fx,
      @ForAll @DoubleRange(max = 25) double fy) {
    WheelLoads left = loads(c, fx, fy);
    WheelLoads right = loads(c, fx, -fy);
    for (int i = 0; i < 4; i++) {
      assertThat(right.load(i ^ 1)).isCloseTo(left.load(i), within(1e-9 * c.mass() * G));
      assertThat(right.byFx(i ^ 1)).isCloseTo(left.byFx(i), within(1e-9 * c.mass()));
      assertThat(right.byFy(i ^ 1)).isCloseTo(-left.byFy(i), within(1e-9 * c.mass()));
    }
  }

  /** Loads and slopes do not jump, whether wheels lift or not: central differences agree. */
  @Property
  void thePartialsAreTheDerivativesEverywhere(
      @ForAll("chassis") Chassis c,
      @ForAll @DoubleRange(min = -25, max = 25) double fx,
      @ForAll @DoubleRange(min = -25, max = 25) double fy) {
    double d = 1e-4;
    WheelLoads w = loads(c, fx, fy);
    // an axle about to leave the ground lifts its wheels within less than a difference can resolve
    double least = 0.01 * c.mass() * G;
    Assume.that(w.load(0) + w.load(1) > least && w.load(2) + w.load(3) > least);
    WheelLoads ahead = loads(c, fx + d, fy);
    WheelLoads behind = loads(c, fx - d, fy);
    WheelLoads left = loads(c, fx, fy + d);
    WheelLoads right = loads(c, fx, fy - d);
    for (int i = 0; i < 4; i++) {
      // the second derivative within the rounding is at most mass/(4 * 0.005 g) per transfer
      double slack = 0.02 * c.mass() * d * 1e2;
      assertThat((ahead.load(i) - behind.load(i)) / (2 * d)).isCloseTo(w.byFx(i), within(slack));
      assertThat((left.load(i) - right.load(i)) / (2 * d)).isCloseTo(w.byFy(i), within(slack));
    }
  }

  @Property
  void downforceThatGrowsWithSpeedShowsInThePartialWithSpeed(
      @ForAll("chassis") Chassis c,
      @ForAll @DoubleRange(min = -12, max = 12) double fx,
      @ForAll @DoubleRange(min = -18, max = 18) double fy,
      @ForAll @DoubleRange(min = 5, max = 80) double v) {
    double d = 1e-3;
    WheelLoads w = atSpeed(c, fx, fy, v);
    WheelLoads more = atSpeed(c, fx, fy, v + d);
    WheelLoads less = atSpeed(c, fx, fy, v - d);
    for (int i = 0; i < 4; i++) {
      assertThat((more.load(i) - less.load(i)) / (2 * d))
          .isCloseTo(w.bySpeed(i), within(0.02 * (1 + 2 * v)));
    }
  }

  private static WheelLoads atSpeed(Chassis c, double fx, double fy, double v) {
    WheelLoads loads = new WheelLoads(c);
    double front = 0.4;
    double rear = 0.7;
    loads.update(
        fx,
        fy,
        G + 0.001 * v * v,
        0.002 * v,
        front * v * v,
        2 * front * v,
        rear * v * v,
        2 * rear * v);
    return loads;
  }
}
