package rampwright.vehicle.trim;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.Car;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;

/** What a plate unit does to a rear-wheel-drive car between an open and a locked axle. */
@Tag("property")
class DifferentialLimitsTest {
  private static final double CAR = Double.POSITIVE_INFINITY;
  private static final double[][] POINTS = {
    {12, 10}, {18, 8}, {25, 12}, {35, 13}, {50, 9}, {20, 2}
  };

  private static final Car TOURING = new CarBuilder().build();

  private static Trims with(Differential law) {
    return new Trims(TOURING, Conditions.STANDARD, DifferentialSet.rear(law));
  }

  private static Trims plate(double preload, double share) {
    return with(new PlateDifferential(preload, share, share));
  }

  private static List<Trim> limits(Trims trims) {
    List<Trim> found = new ArrayList<>();
    for (double[] p : POINTS) {
      double kappa = p[1] / (p[0] * p[0]);
      found.add(trims.driveLimit(p[0], kappa, 0, CAR).orElseThrow().trim());
      found.add(trims.brakeLimit(p[0], kappa, 0, CAR).orElseThrow().trim());
      found.add(trims.cornerLimit(kappa, 0, CAR).orElseThrow().trim());
    }
    return found;
  }

  private static void same(List<Trim> some, List<Trim> others, double slack) {
    for (int i = 0; i < some.size(); i++) {
      Trim a = some.get(i);
      Trim b = others.get(i);
      assertThat(a.speed()).isCloseTo(b.speed(), within(slack));
      assertThat(a.ax()).isCloseTo(b.ax(), within(slack));
      assertThat(a.steer()).isCloseTo(b.steer(), within(slack));
      assertThat(a.sideslip()).isCloseTo(b.sideslip(), within(slack));
    }
  }

  @Test
  void aPlateUnitWithoutPreloadAndShareIsOpen() {
    same(limits(plate(0, 0)), limits(with(OpenDifferential.IDEAL)), 1e-6);
  }

  @Test
  void aPlateUnitThatHardlySlidesGoesToTheOpenOne() {
    same(limits(plate(0.01, 0)), limits(with(OpenDifferential.IDEAL)), 1e-3);
  }

  @Test
  void aPlateUnitThatNeverSlidesIsASpool() {
    same(limits(plate(5000, 100)), limits(with(new Spool())), 1e-4);
  }

  @Test
  void theTorqueDifferenceLiesBetweenOpenAndLocked() {
    for (double[] p : POINTS) {
      double kappa = p[1] / (p[0] * p[0]);
      Trims plate = plate(60, 0.2);
      Trims spool = with(new Spool());
      for (double torque : new double[] {-100, 0, 100, 300}) {
        Trim between = plate.atCageTorque(p[0], kappa, 0, torque).orElseThrow();
        Trim locked = spool.atCageTorque(p[0], kappa, 0, torque).orElseThrow();
        DifferentialState d = between.axles().get(1);
        assertThat(d.torqueDifference())
            .isBetween(0.0, locked.axles().get(1).torqueDifference() + 1);
        assertThat(d.torqueDifference()).isLessThanOrEqualTo(d.capacity() + 1e-3);
        assertThat(d.slidingPower()).isGreaterThanOrEqualTo(0);
        assertThat(locked.axles().get(1).slidingPower()).isCloseTo(0, within(1e-3));
      }
    }
  }

  /**
   * In fast corners the inside wheel spins first, and lock gives its torque to the outside wheel.
   * (In slow ones the inside wheel is the slower one, and a little lock overloads it further.)
   */
  @Test
  void theCarsDriveLimitGrowsWithLockInFastCorners() {
    for (double[] p : new double[][] {{25, 12}, {35, 13}, {50, 9}}) {
      double kappa = p[1] / (p[0] * p[0]);
      double before = 0;
      for (double share : new double[] {0, 0.1, 0.2, 0.4, 0.8}) {
        double ax = plate(0, share).driveLimit(p[0], kappa, 0, CAR).orElseThrow().trim().ax();
        assertThat(ax).as("%s m/s, share %s", p[0], share).isGreaterThan(before - 1e-6);
        before = ax;
      }
    }
  }

  /**
   * The torque dip: at 12 m/s and 10 m/s² the inside wheel passes its peak first and slides, torque
   * falls until the unit sticks, and the highest torque lies beyond the dip.
   */
  @Test
  void theTorqueDipIsCrossed() {
    double v = 12;
    double kappa = 10 / (v * v);
    Trims trims = plate(60, 0.2);
    Trims.AtLimit limit = trims.driveLimit(v, kappa, 0, CAR).orElseThrow();
    Trim last = null;
    Trim landed = null;
    for (double torque = 100; torque < limit.trim().cageTorque() && landed == null; torque += 4) {
      Trim t = trims.atCageTorque(v, kappa, 0, torque).orElseThrow();
      boolean jumped = last != null && t.axles().get(1).sticking() && slides(last);
      if (jumped) {
        landed = t;
      } else {
        last = t;
      }
    }
    assertThat(landed).as("trim beyond the dip").isNotNull();
    assertThat(slides(last)).isTrue();
    double slipBefore = (last.wheels().get(2).slip() + last.wheels().get(3).slip()) / 2;
    double slipAfter = (landed.wheels().get(2).slip() + landed.wheels().get(3).slip()) / 2;
    assertThat(slipAfter - slipBefore).as("jump of mean slip").isGreaterThan(0.005);
    assertThat(limit.reason()).isEqualTo(TrimLimit.TYRES);
    // the highest torque lies where the unit is about to slide the other way
    assertThat(limit.trim().axles().get(1).speedDifference()).isCloseTo(0, within(1e-3));
    assertThat(limit.trim().ax()).isGreaterThan(1.8 * last.ax());
  }

  private static boolean slides(Trim t) {
    return !t.axles().get(1).sticking();
  }

  /** With the driver's limit more lock on power helps first and hurts later. */
  @Test
  void theDriversDriveLimitIsBestBetweenOpenAndLocked() {
    double v = 30;
    double kappa = 12 / (v * v);
    double[] shares = {0, 0.1, 0.2, 0.3, 0.5};
    double[] ax = new double[shares.length];
    int best = 0;
    for (int i = 0; i < shares.length; i++) {
      ax[i] = plate(0, shares[i]).driveLimit(v, kappa, 0, 0).orElseThrow().trim().ax();
      best = ax[i] > ax[best] ? i : best;
    }
    double locked = with(new Spool()).driveLimit(v, kappa, 0, 0).orElseThrow().trim().ax();
    assertThat(best).isBetween(1, shares.length - 2);
    assertThat(ax[best]).isGreaterThan(1.15 * ax[0]);
    assertThat(ax[best]).isGreaterThan(1.05 * locked);
  }
}
