package rampwright.vehicle.manoeuvre;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.BrakeLock;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.PlateFriction;
import rampwright.vehicle.differential.PreloadPath;
import rampwright.vehicle.differential.RefinedPlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.differential.TorqueSensingDifferential;
import rampwright.vehicle.differential.ViscousDifferential;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.file.TyreFile;
import rampwright.vehicle.trim.Trim;
import rampwright.vehicle.trim.Trims;
import rampwright.vehicle.tyre.Tyre;

/**
 * The time-domain model, written apart from the trim equations, settles on the trims: two
 * independent ways to the same steady state.
 */
class SettlingTest {
  private static final List<Differential> LAWS =
      List.of(
          OpenDifferential.IDEAL,
          new PlateDifferential(60, 0.3, 0.15),
          new RefinedPlateDifferential(
              new PlateDifferential(60, 0.3, 0.15),
              0.03,
              PreloadPath.SERIES,
              new PlateFriction(0.8, 3, 110, 80, 0.002)),
          new Spool(),
          new ViscousDifferential(60, 4, 0.6),
          new TorqueSensingDifferential(10, 2.2, 1.6),
          new BrakeLock(0.01, 9000, 500));

  /** Magic Formula tyre, so that both tyre models are driven. */
  private static final Tyre ROAD_RADIAL =
      TyreFile.read(
          FileSource.classPath(SettlingTest.class.getClassLoader(), "rampwright/samples/"),
          "tyres/road_radial.yaml");

  @Test
  void theMotionSettlesOnTheTrims() {
    int settled = 0;
    for (DriveLayout layout : DriveLayout.values()) {
      for (Differential law : LAWS) {
        settled += settle(layout, law);
      }
    }
    assertThat(settled).isGreaterThanOrEqualTo(150);
  }

  private static int settle(DriveLayout layout, Differential law) {
    CarBuilder b = new CarBuilder();
    b.layout = layout;
    b.frontTorqueShare = 0.45;
    if (layout == DriveLayout.FRONT) {
      b.front = ROAD_RADIAL;
      b.rear = ROAD_RADIAL;
    }
    DifferentialSet set = new DifferentialSet(law, law, law);
    Trims trims = new Trims(b.build(), Conditions.STANDARD, set);
    MotionSolver solver =
        new MotionSolver(b.build(), Conditions.STANDARD, set, RotatingParts.USUAL);
    int settled = 0;
    for (double speed : new double[] {14, 26}) {
      for (double ay : new double[] {4, -8}) {
        for (double torque : new double[] {-150, 450}) {
          Optional<Trim> trim = steadyTurn(trims, speed, ay / (speed * speed), torque);
          if (trim.isPresent() && trim.get().sigma() < -1) {
            check(solver, trim.get());
            settled++;
          }
        }
      }
    }
    return settled;
  }

  /** The curvature gradient is the one at which the yaw rate stays the same at a held speed. */
  private static Optional<Trim> steadyTurn(
      Trims trims, double speed, double curvature, double torque) {
    double gradient = 0;
    Optional<Trim> trim = Optional.empty();
    for (int i = 0; i < 12; i++) {
      trim = trims.atCageTorque(speed, curvature, gradient, torque);
      if (trim.isEmpty()) {
        return trim;
      }
      gradient = -curvature * trim.get().ax() / (speed * speed);
    }
    return trim;
  }

  private static void check(MotionSolver solver, Trim trim) {
    MotionState there = MotionState.of(trim);
    // a start well away: straighter, and all wheels rolling free
    double speed = trim.speed();
    double sideslip = 0.5 * trim.sideslip();
    MotionState start =
        new MotionState(
            speed * Math.cos(sideslip),
            speed * Math.sin(sideslip),
            0.7 * there.yawRate(),
            Stream.of(0, 1, 2, 3).map(i -> speed / 0.318).toList());
    Controls held = Controls.steady(trim.steer(), trim.cageTorque(), trim.brakeTorque());
    double duration = Math.min(12, 14 / -trim.sigma());
    MotionSample end = solver.atHeldSpeed(start, held, duration, duration).last();
    String what = "v " + speed + " kappa " + trim.curvature() + " T " + trim.cageTorque();
    assertThat(end.ax()).as(what).isCloseTo(trim.ax(), within(1e-3 * Math.abs(trim.ax()) + 1e-5));
    assertThat(end.ay()).as(what).isCloseTo(trim.ay(), within(1e-3 * Math.abs(trim.ay())));
    double outward =
        trim.curvature() > 0 ? -end.yawMomentDifferential() : end.yawMomentDifferential();
    assertThat(outward)
        .as(what)
        .isCloseTo(
            trim.yawMomentDifferential(),
            within(1e-3 * Math.abs(trim.yawMomentDifferential()) + 0.1));
    assertThat(end.state().sideslip()).as(what).isCloseTo(trim.sideslip(), within(1e-5));
  }
}
