package rampwright.vehicle.trim;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.vehicle.Car;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.Wheel;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.driveline.DriveLayout;

/** Every trim must satisfy the equations of motion as {@link TrimCheck} writes them. */
@Tag("property")
class TrimBalanceTest {
  private static final double CAR = Double.POSITIVE_INFINITY;

  static Stream<Arguments> cases() {
    List<Arguments> cases = new ArrayList<>();
    Differential[] laws = {
      OpenDifferential.IDEAL,
      new OpenDifferential(0.1),
      new PlateDifferential(60, 0.2, 0.1),
      new PlateDifferential(20, 0.6, 0.4),
      new Spool()
    };
    for (DriveLayout layout : DriveLayout.values()) {
      for (Differential law : laws) {
        cases.add(arguments(layout, law));
      }
    }
    return cases.stream();
  }

  private static Car car(DriveLayout layout) {
    CarBuilder builder = new CarBuilder();
    builder.layout = layout;
    builder.frontTorqueShare = 0.4;
    return builder.build();
  }

  private static DifferentialSet set(DriveLayout layout, Differential law) {
    return switch (layout) {
      case REAR -> DifferentialSet.rear(law);
      case FRONT -> new DifferentialSet(law, OpenDifferential.IDEAL, OpenDifferential.IDEAL);
      case ALL -> new DifferentialSet(OpenDifferential.IDEAL, law, law);
    };
  }

  /** Trims at all three limits and at part throttle, over speeds, radii and curvature gradients. */
  private static List<Trim> trims(Trims trims) {
    List<Trim> found = new ArrayList<>();
    double[][] points = {{0, 0}, {0.004, 0}, {0.012, 0.0004}, {0.012, -0.0004}, {0.04, 0}};
    for (double[] p : points) {
      for (double growth : new double[] {CAR, 1}) {
        if (p[0] != 0) {
          found.add(trims.cornerLimit(p[0], p[1], growth).orElseThrow().trim());
        }
      }
      double top =
          trims.cornerLimit(p[0], p[1], CAR).map(limit -> limit.trim().speed()).orElse(60.0);
      for (double share : new double[] {0.3, 0.7, 0.95}) {
        double v = share * top;
        found.add(trims.atCageTorque(v, p[0], p[1], -80).orElseThrow());
        trims.atCageTorque(v, p[0], p[1], 150).ifPresent(found::add);
        for (double growth : new double[] {CAR, 1}) {
          found.add(trims.driveLimit(v, p[0], p[1], growth).orElseThrow().trim());
          found.add(trims.brakeLimit(v, p[0], p[1], growth).orElseThrow().trim());
        }
      }
    }
    return found;
  }

  @ParameterizedTest(name = "{0} {1}")
  @MethodSource("cases")
  void everyTrimBalances(DriveLayout layout, Differential law) {
    Car car = car(layout);
    DifferentialSet set = set(layout, law);
    List<Trim> found = trims(new Trims(car, Conditions.STANDARD, set));
    TrimCheck check = new TrimCheck(car, Conditions.STANDARD, set);
    found.forEach(check::check);
  }

  @ParameterizedTest(name = "{0} {1}")
  @MethodSource("cases")
  void aRightTurnIsTheMirrorImageOfALeftTurn(DriveLayout layout, Differential law) {
    Trims trims = new Trims(car(layout), Conditions.STANDARD, set(layout, law));
    for (double v : new double[] {12, 22, 30}) {
      double kappa = 9 / (v * v);
      mirrored(
          trims.driveLimit(v, kappa, 1e-4, CAR).orElseThrow().trim(),
          trims.driveLimit(v, -kappa, -1e-4, CAR).orElseThrow().trim());
      mirrored(
          trims.brakeLimit(v, kappa, 1e-4, 1).orElseThrow().trim(),
          trims.brakeLimit(v, -kappa, -1e-4, 1).orElseThrow().trim());
    }
    mirrored(
        trims.cornerLimit(0.02, 0, CAR).orElseThrow().trim(),
        trims.cornerLimit(-0.02, 0, CAR).orElseThrow().trim());
  }

  private static void mirrored(Trim left, Trim right) {
    assertThat(right.speed()).isCloseTo(left.speed(), within(1e-5));
    assertThat(right.sideslip()).isCloseTo(-left.sideslip(), within(1e-5));
    assertThat(right.steer()).isCloseTo(-left.steer(), within(1e-5));
    assertThat(right.ax()).isCloseTo(left.ax(), within(1e-4));
    assertThat(right.ay()).isCloseTo(-left.ay(), within(1e-4));
    assertThat(right.cageTorque()).isCloseTo(left.cageTorque(), within(0.1));
    assertThat(right.yawMomentDifferential()).isCloseTo(left.yawMomentDifferential(), within(0.5));
    assertThat(right.sigma()).isCloseTo(left.sigma(), within(1e-3));
    for (Wheel wheel : Wheel.values()) {
      WheelState l = left.wheel(wheel);
      WheelState r = right.wheels().get(wheel.ordinal() ^ 1);
      assertThat(r.fx()).isCloseTo(l.fx(), within(0.5));
      assertThat(r.fy()).isCloseTo(-l.fy(), within(0.5));
      assertThat(r.fz()).isCloseTo(l.fz(), within(0.5));
      assertThat(r.slip()).isCloseTo(l.slip(), within(1e-5));
    }
  }
}
