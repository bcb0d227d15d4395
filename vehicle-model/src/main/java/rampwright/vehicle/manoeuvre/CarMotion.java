package rampwright.vehicle.manoeuvre;

import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.driveline.DriveLayout;

/**
 * Equations of motion on a flat road without wind:
 *
 * <pre>
 *   m (dvx/dt - r vy) = X - D cos(beta)     m (dvy/dt + r vx) = Y - D sin(beta)
 *   Izz dr/dt = M                           I dw/dt = T_wheel - Fx R - T_brake
 * </pre>
 *
 * With the speed held, a force at the centre of gravity along the path keeps it, as on a treadmill:
 * the motion then settles on the quasi-steady state of that speed. A workspace.
 */
final class CarMotion implements FirstOrderDifferentialEquations {
  final RoadForces road;
  final DrivelineMotion driveline;
  private final Controls controls;
  private final boolean holdSpeed;
  private final DriveLayout layout;

  /** Acceleration along and across the path (m/s²), without the force that holds the speed. */
  double ax;

  double ay;

  /** Cage torque at the last evaluation (N·m). */
  double cageTorque;

  CarMotion(
      Car car,
      Conditions conditions,
      DifferentialSet differentials,
      RotatingParts parts,
      Controls controls,
      boolean holdSpeed) {
    this.road = new RoadForces(car, conditions);
    this.driveline = new DrivelineMotion(car, differentials, parts);
    this.controls = controls;
    this.holdSpeed = holdSpeed;
    this.layout = car.driveline().layout();
  }

  @Override
  public int getDimension() {
    return MotionState.SIZE;
  }

  @Override
  public void computeDerivatives(double time, double[] y, double[] rate) {
    evaluate(time, y);
    double speed = Math.hypot(y[0], y[1]);
    double cos = y[0] / speed;
    double sin = y[1] / speed;
    double along = holdSpeed ? 0 : ax;
    // the path's tangent is (cos, sin) in the body, its normal (-sin, cos)
    double yawRate = y[MotionState.YAW_RATE];
    rate[0] = along * cos - ay * sin + yawRate * y[1];
    rate[1] = along * sin + ay * cos - yawRate * y[0];
    rate[MotionState.YAW_RATE] = road.yawMoment / road.yawInertia;
    System.arraycopy(driveline.acceleration, 0, rate, MotionState.WHEEL, 4);
  }

  /** Evaluates forces, torques and accelerations. */
  void evaluate(double time, double[] y) {
    road.evaluate(y, controls.steer(time));
    cageTorque = controls.cageTorque(time, driveline.cageSpeed(y));
    driveline.update(y, road, cageTorque, controls.brakeTorque(time));
    double speed = Math.hypot(y[0], y[1]);
    double cos = y[0] / speed;
    double sin = y[1] / speed;
    ax = (road.forceX * cos + road.forceY * sin - road.drag) / road.mass;
    ay = (road.forceY * cos - road.forceX * sin) / road.mass;
  }

  /** Returns the yaw moment of unequal longitudinal forces on the driven axles (N·m), leftwards. */
  double differentialYawMoment() {
    double moment = 0;
    if (layout != DriveLayout.REAR) {
      moment += (road.fx[1] - road.fx[0]) * road.halfTrack(0);
    }
    if (layout != DriveLayout.FRONT) {
      moment += (road.fx[3] - road.fx[2]) * road.halfTrack(1);
    }
    return moment;
  }

  MotionSample sample(double time, double[] y) {
    evaluate(time, y);
    return new MotionSample(
        time, MotionState.of(y), ax, ay, differentialYawMoment(), cageTorque, controls.steer(time));
  }
}
