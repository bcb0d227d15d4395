package rampwright.vehicle.manoeuvre;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.trim.Trim;
import rampwright.vehicle.trim.Trims;

class MotionSolverTest {
  private static final double RADIUS = 0.318;

  private static MotionSolver solver(CarBuilder b, Differential law) {
    return new MotionSolver(
        b.build(), Conditions.STANDARD, DifferentialSet.rear(law), RotatingParts.USUAL);
  }

  private static MotionState straight(double speed, double leftAhead) {
    double rolling = speed / RADIUS;
    return new MotionState(speed, 0, 0, List.of(rolling, rolling, rolling + leftAhead, rolling));
  }

  private static double difference(MotionSample sample) {
    return sample.state().wheelSpeeds().get(2) - sample.state().wheelSpeeds().get(3);
  }

  @Test
  void aUnitThatSlidesSticksAtEqualSpeedsAndStays() {
    Motion motion =
        solver(new CarBuilder(), new PlateDifferential(200, 0, 0))
            .drive(straight(20, 3), Controls.steady(0, 0, 0), 0.3, 0.001);
    assertThat(difference(motion.samples().get(0))).isEqualTo(3);
    int stuck = 0;
    while (difference(motion.samples().get(stuck)) != 0) {
      stuck++;
    }
    assertThat(stuck).isBetween(2, 60);
    for (MotionSample sample : motion.samples().subList(stuck, motion.samples().size())) {
      assertThat(difference(sample)).isCloseTo(0, within(1e-9));
    }
  }

  @Test
  void aUnitThatSticksBreaksAwayAtItsCapacity() {
    // a tightening turn asks more and more torque difference of a unit with little preload
    Controls turning =
        new Controls() {
          @Override
          public double steer(double time) {
            return 0.05 * Math.min(1, time);
          }

          @Override
          public double cageTorque(double time, double cageSpeed) {
            return 150;
          }

          @Override
          public double brakeTorque(double time) {
            return 0;
          }
        };
    Motion motion =
        solver(new CarBuilder(), new PlateDifferential(80, 0, 0))
            .drive(straight(15, 0), turning, 1.5, 0.01);
    assertThat(difference(motion.samples().get(5))).isZero();
    assertThat(difference(motion.last())).isLessThan(-0.1);
    Motion locked =
        solver(new CarBuilder(), new Spool()).drive(straight(15, 0), turning, 1.5, 0.01);
    for (MotionSample sample : locked.samples()) {
      assertThat(difference(sample)).isCloseTo(0, within(1e-9));
    }
  }

  @Test
  void leftAndRightAreMirrorImages() {
    Differential law = new PlateDifferential(60, 0.3, 0.1);
    Motion left =
        solver(new CarBuilder(), law).drive(straight(25, 0), Controls.steady(0.03, 400, 0), 1, 0.1);
    Motion right =
        solver(new CarBuilder(), law)
            .drive(straight(25, 0), Controls.steady(-0.03, 400, 0), 1, 0.1);
    for (int i = 0; i < left.samples().size(); i++) {
      MotionState l = left.samples().get(i).state();
      MotionState r = right.samples().get(i).state();
      assertThat(r.yawRate()).isCloseTo(-l.yawRate(), within(1e-7));
      assertThat(r.vy()).isCloseTo(-l.vy(), within(1e-6));
      assertThat(r.wheelSpeeds().get(2)).isCloseTo(l.wheelSpeeds().get(3), within(1e-6));
    }
  }

  /**
   * Energy: what the cage brings is found again as motion, heat of tyres and differential, and
   * drag.
   */
  @Test
  void energyIsAccountedFor() {
    CarBuilder b = new CarBuilder();
    double step = 0.001;
    double torque = 500;
    Motion motion =
        solver(b, OpenDifferential.IDEAL)
            .drive(straight(20, 0), Controls.steady(0, torque, 0), 1, step);
    double supplied = 0;
    double drag = 0;
    for (MotionSample sample : motion.samples()) {
      boolean end = sample.time() == 0 || sample == motion.last();
      double weight = end ? step / 2 : step;
      List<Double> wheels = sample.state().wheelSpeeds();
      supplied += weight * torque * (wheels.get(2) + wheels.get(3)) / 2;
      drag += weight * 0.5 * 1.225 * b.dragArea * Math.pow(sample.state().speed(), 3);
    }
    double gained = energy(motion.last().state(), b.mass) - energy(straight(20, 0), b.mass);
    double slip = supplied - drag - gained;
    // what is left heats the driven tyres: about force times slip speed
    double force = torque / RADIUS;
    double slipSpeed =
        motion.last().state().wheelSpeeds().get(2) * RADIUS - motion.last().state().speed();
    assertThat(slip).isBetween(0.9 * force * slipSpeed, 1.1 * force * slipSpeed);
  }

  private static double energy(MotionState state, double mass) {
    double sum = 0.5 * mass * state.speed() * state.speed();
    for (double wheel : state.wheelSpeeds()) {
      sum += 0.5 * 1.1 * wheel * wheel;
    }
    return sum;
  }

  /** A slide grows as fast as the linearised trim says. */
  @Test
  void aSlideGrowsAtTheTrimsRate() {
    CarBuilder b = new CarBuilder();
    b.frontRollShare = 0.35;
    DifferentialSet set = DifferentialSet.rear(new Spool());
    Trims trims = new Trims(b.build(), Conditions.STANDARD, set);
    double speed = 30;
    double curvature = 12.0 / (speed * speed);
    Trim trim = null;
    double gradient = 0;
    for (double torque = 200; torque < 3000; torque += 50) {
      for (int i = 0; i < 12; i++) {
        Trim next = trims.atCageTorque(speed, curvature, gradient, torque).orElse(null);
        if (next == null) {
          break;
        }
        trim = next;
        gradient = -curvature * trim.ax() / (speed * speed);
      }
      if (trim.sigma() > 1) {
        break;
      }
    }
    assertThat(trim.sigma()).isBetween(0.5, 4.0);
    MotionState there = MotionState.of(trim);
    double nudge = 1e-5;
    MotionState start =
        new MotionState(there.vx(), there.vy() - nudge, there.yawRate(), there.wheelSpeeds());
    Motion motion =
        solver(b, new Spool())
            .atHeldSpeed(start, Controls.steady(trim.steer(), trim.cageTorque(), 0), 3.5, 0.1);
    double early = motion.samples().get(25).state().sideslip() - trim.sideslip();
    double late = motion.samples().get(35).state().sideslip() - trim.sideslip();
    assertThat(Math.log(late / early)).isCloseTo(trim.sigma(), within(0.05 * trim.sigma()));
  }
}
