package rampwright.vehicle.differential.preload;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import rampwright.vehicle.differential.FacePressure;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.PlateHardware;
import rampwright.vehicle.differential.RingSet;
import rampwright.vehicle.input.InvalidInput;

class PreloadSpringsTest {
  private static final DiscSpring SPRING = new DiscSpring(0.1, 0.051, 2.7e-3, 1.5e-3);
  private static final DiscStack STACK = new DiscStack(SPRING, 1, 1);

  /** Room 0.3 mm longer than the free height of 4.2 mm. */
  private static final PreloadSprings SPRINGS = new PreloadSprings(STACK, 4.5e-3);

  private static PlateBuild build(int faces, double preload) {
    PlateHardware hardware =
        new PlateHardware(0.052, 0.036, 0.11, 0.034, 0.08, FacePressure.UNIFORM_WEAR);
    double angle = Math.toRadians(45);
    return new PlateBuild(
        hardware, new RingSet("45/45", angle, angle, false), false, faces, preload);
  }

  @Test
  void parallelSpringsAddForceAndGroupsInSeriesAddDeflection() {
    DiscStack stack = new DiscStack(SPRING, 3, 4);
    assertThat(stack.force(4 * 0.5e-3)).isCloseTo(3 * SPRING.force(0.5e-3), within(1e-9));
    assertThat(stack.rate(4 * 0.5e-3)).isCloseTo(0.75 * SPRING.rate(0.5e-3), within(1e-6));
    assertThat(stack.freeHeight()).isCloseTo(4 * (1.5e-3 + 3 * 2.7e-3), within(1e-15));
    assertThat(stack.deflection(3 * SPRING.force(0.5e-3))).isCloseTo(2e-3, within(1e-12));
    assertThat(stack.risingDeflection()).isCloseTo(4 * 1.5e-3, within(1e-15));
  }

  @Test
  void torqueFromShimByHand() {
    // 0.5 mm of shims: 0.3 fill the room, 0.2 press the spring; 6 faces, 0.11, 44 mm, two packs
    double force = SPRING.force(0.2e-3);
    assertThat(SPRINGS.preload(0.5e-3, build(6, 0)))
        .isCloseTo(2 * 6 * 0.11 * 0.044 * force, within(1e-9));
    assertThat(SPRINGS.preload(0.2e-3, build(6, 0))).isZero();
    assertThat(SPRINGS.preloadRate(0.2e-3, build(6, 0))).isZero();
  }

  @Test
  void shimFromTorqueAndBack() {
    for (double preload : new double[] {10, 60, 150}) {
      PlateBuild build = build(8, preload);
      double shim = SPRINGS.shim(build);
      assertThat(SPRINGS.preload(shim, build)).isCloseTo(preload, within(1e-8));
      assertThat(SPRINGS.reliable(shim)).isTrue();
    }
  }

  @Test
  void theRateIsTheSlopeOfThePreload() {
    PlateBuild build = build(8, 60);
    double slope = (SPRINGS.preload(0.501e-3, build) - SPRINGS.preload(0.499e-3, build)) / 0.002e-3;
    assertThat(SPRINGS.preloadRate(0.5e-3, build)).isCloseTo(slope, within(1e-4 * slope));
  }

  @Test
  void moreFacesNeedThinnerShims() {
    assertThat(SPRINGS.shim(build(10, 60))).isLessThan(SPRINGS.shim(build(4, 60)));
  }

  @Test
  void scatterAddsTheTolerancesAsSquares() {
    PlateBuild build = build(6, 80);
    double shim = SPRINGS.shim(build);
    assertThat(SPRINGS.scatter(shim, build, 0, 0, 0.15)).isCloseTo(12, within(1e-6));
    assertThat(SPRINGS.scatter(shim, build, 0, 0.06, 0.08)).isCloseTo(8, within(1e-6));
    assertThat(SPRINGS.scatter(shim, build, 0.02e-3, 0, 0))
        .isCloseTo(0.02e-3 * SPRINGS.preloadRate(shim, build), within(1e-9));
  }

  @Test
  void aFlatSpringIsNotReliable() {
    assertThat(SPRINGS.reliable(0.3e-3 + 1.5e-3)).isFalse();
  }

  @Test
  void aPreloadBelowTheUnshimmedOneIsRejected() {
    PreloadSprings tight = new PreloadSprings(STACK, 4e-3);
    PlateBuild build = build(6, 10);
    assertThat(tight.gives(build)).isFalse();
    assertThat(tight.gives(build(6, 150))).isTrue();
    assertThat(tight.gives(build(6, 5000))).isFalse();
    double least = 2 * 6 * 0.11 * 0.044 * SPRING.force(0.2e-3);
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> tight.shim(build))
        .withMessage(
            "The preload (whole torque difference) (10 N·m) must be at least the %.1f N·m of the"
                + " springs without shims. Maybe fit thinner springs or fewer in parallel.",
            least);
  }
}
