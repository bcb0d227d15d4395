package rampwright.vehicle.manoeuvre;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.ode.events.EventHandler;
import org.apache.commons.math3.ode.nonstiff.DormandPrince54Integrator;
import org.apache.commons.math3.ode.sampling.StepHandler;
import org.apache.commons.math3.ode.sampling.StepInterpolator;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.DifferentialSet;

/**
 * Integrates the motion of a car. Sticking and sliding of each differential change at events that
 * are located in time, and the integration starts afresh behind each: there is no smoothing.
 */
public final class MotionSolver {
  private static final double LARGEST_STEP = 0.02;
  private static final double TOLERANCE = 1e-8;
  private static final double EVENT_CHECK = 0.005;
  private static final double EVENT_TIME = 1e-9;
  private static final int EVENT_ITERATIONS = 100;
  private static final int MOST_EVENTS = 20_000;

  /** Output speeds (rad/s) that differ by less are equal when a unit is to stick. */
  private static final double EQUAL_SPEEDS = 1e-6;

  private static final double LARGEST_SIDESLIP = Math.PI / 3;
  private static final double LEAST_SPEED = 3;

  private final Car car;
  private final Conditions conditions;
  private final DifferentialSet differentials;
  private final RotatingParts parts;

  /** Takes what stays the same. */
  public MotionSolver(
      Car car, Conditions conditions, DifferentialSet differentials, RotatingParts parts) {
    this.car = car;
    this.conditions = conditions;
    this.differentials = differentials;
    this.parts = parts;
  }

  /**
   * Integrates.
   *
   * @param start state at time zero
   * @param controls what the driver does
   * @param duration time to cover (s)
   * @param spacing time between samples (s)
   */
  public Motion drive(MotionState start, Controls controls, double duration, double spacing) {
    return new Run(controls, false, duration, spacing).from(start.toArray());
  }

  /** Integrates like {@link #drive} with the speed along the path held by an outer force. */
  public Motion atHeldSpeed(MotionState start, Controls controls, double duration, double spacing) {
    return new Run(controls, true, duration, spacing).from(start.toArray());
  }

  /** One integration. */
  private final class Run {
    private final CarMotion motion;
    private final double duration;
    private final double spacing;
    private final List<MotionSample> samples = new ArrayList<>();
    private FrictionUnit changed;
    private Motion.Ending ending;

    Run(Controls controls, boolean holdSpeed, double duration, double spacing) {
      this.motion = new CarMotion(car, conditions, differentials, parts, controls, holdSpeed);
      this.duration = duration;
      this.spacing = spacing;
    }

    Motion from(double[] y) {
      decideAll(y);
      samples.add(motion.sample(0, y));
      double time = 0;
      for (int events = 0; time < duration && ending == null; events++) {
        if (events > MOST_EVENTS) {
          throw new IllegalStateException("the differentials stick and slide without end");
        }
        changed = null;
        time = integrator().integrate(motion, time, y, duration, y);
        if (changed != null) {
          change(time, y);
        }
      }
      return new Motion(samples, ending == null ? Motion.Ending.COMPLETE : ending);
    }

    /** From the centre outwards, because the axles' shares follow from the centre unit. */
    private void decideAll(double[] y) {
      for (FrictionUnit unit : motion.driveline.units) {
        motion.evaluate(0, y);
        unit.decide(EQUAL_SPEEDS);
        if (unit.sticking()) {
          motion.driveline.join(unit, y);
        } else if (unit.atEqualSpeeds(EQUAL_SPEEDS)) {
          motion.driveline.part(unit, y);
        }
      }
    }

    private void change(double time, double[] y) {
      boolean stuck = changed.sticking();
      if (!stuck) {
        motion.driveline.join(changed, y);
      }
      motion.evaluate(time, y);
      if (stuck) {
        changed.breakAway();
      } else {
        changed.decide(EQUAL_SPEEDS);
      }
      if (!changed.sticking()) {
        motion.driveline.part(changed, y);
      }
    }

    private DormandPrince54Integrator integrator() {
      DormandPrince54Integrator integrator =
          new DormandPrince54Integrator(1e-12, LARGEST_STEP, TOLERANCE, TOLERANCE);
      for (FrictionUnit unit : motion.driveline.units) {
        if (unit.law.capacity(0) > 0 || unit.law.capacity(1) > 0 || unit.law.capacity(-1) > 0) {
          watch(integrator, new Change(unit));
        }
      }
      watch(integrator, new End(Motion.Ending.SPUN));
      watch(integrator, new End(Motion.Ending.SLOW));
      watch(integrator, new End(Motion.Ending.WHEEL_LOCKED));
      integrator.addStepHandler(new Sampler());
      return integrator;
    }

    private void watch(DormandPrince54Integrator integrator, EventHandler handler) {
      integrator.addEventHandler(handler, EVENT_CHECK, EVENT_TIME, EVENT_ITERATIONS);
    }

    /** A unit begins to stick or to slide. */
    private final class Change implements EventHandler {
      private final FrictionUnit unit;

      Change(FrictionUnit unit) {
        this.unit = unit;
      }

      @Override
      public void init(double t0, double[] y0, double t) {}

      @Override
      public double g(double time, double[] y) {
        motion.evaluate(time, y);
        return unit.margin();
      }

      @Override
      public Action eventOccurred(double time, double[] y, boolean increasing) {
        if (increasing) {
          return Action.CONTINUE;
        }
        changed = unit;
        return Action.STOP;
      }

      @Override
      public void resetState(double time, double[] y) {}
    }

    /** The motion leaves what the model covers. */
    private final class End implements EventHandler {
      private final Motion.Ending kind;

      End(Motion.Ending kind) {
        this.kind = kind;
      }

      @Override
      public void init(double t0, double[] y0, double t) {}

      @Override
      public double g(double time, double[] y) {
        return switch (kind) {
          case SPUN -> LARGEST_SIDESLIP - Math.abs(Math.atan2(y[1], y[0]));
          case SLOW -> Math.hypot(y[0], y[1]) - LEAST_SPEED;
          default -> {
            double least = y[MotionState.WHEEL];
            for (int i = 1; i < 4; i++) {
              least = Math.min(least, y[MotionState.WHEEL + i]);
            }
            yield least;
          }
        };
      }

      @Override
      public Action eventOccurred(double time, double[] y, boolean increasing) {
        ending = kind;
        return Action.STOP;
      }

      @Override
      public void resetState(double time, double[] y) {}
    }

    /** Takes samples at even spacing out of the integrator's steps. */
    private final class Sampler implements StepHandler {
      @Override
      public void init(double t0, double[] y0, double t) {}

      @Override
      public void handleStep(StepInterpolator step, boolean isLast) {
        double next = samples.size() * spacing;
        while (next <= step.getCurrentTime() + EVENT_TIME && next <= duration + EVENT_TIME) {
          step.setInterpolatedTime(next);
          samples.add(motion.sample(next, step.getInterpolatedState().clone()));
          next = samples.size() * spacing;
        }
      }
    }
  }
}
