package rampwright.vehicle.trim;

import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.Chassis;
import rampwright.vehicle.chassis.WheelLoads;
import rampwright.vehicle.tyre.Tyre;
import rampwright.vehicle.tyre.TyreForces;

/**
 * The equations of motion of a car on a flat road, written a second time from the textbook and
 * apart from the solver: vectors in metres and newtons, no partials. Only tyres and wheel loads are
 * shared with the solver; they have tests of their own.
 */
final class PlanarCar {
  final Car car;
  final double mass;
  final double inertia;
  private final Chassis chassis;
  private final Conditions conditions;
  private final WheelLoads loads;

  /**
   * Force along and across the body (N), yaw moment (N·m), wheel torques, speeds, angles, loads.
   */
  static final class Motion {
    double forceX;
    double forceY;
    double yawMoment;
    final double[] torque = new double[4];
    final double[] wheelSpeed = new double[4];
    final double[] slipAngle = new double[4];
    final double[] load = new double[4];
    final double[] fx = new double[4];
    final double[] fy = new double[4];
  }

  PlanarCar(Car car, Conditions conditions) {
    this.car = car;
    this.conditions = conditions;
    this.chassis = car.chassis().withAddedMass(conditions.fuelMass());
    this.mass = chassis.mass();
    this.inertia = chassis.yawInertia();
    this.loads = new WheelLoads(chassis);
  }

  double drag(double speed) {
    return 0.5 * conditions.airDensity() * car.aero().dragArea() * speed * speed;
  }

  double radius(int wheel) {
    return wheel < 2 ? car.frontRadius() : car.rearRadius();
  }

  double wheelX(int wheel) {
    return wheel < 2 ? chassis.cgToFrontAxle() : -chassis.cgToRearAxle();
  }

  double wheelY(int wheel) {
    double half = (wheel < 2 ? chassis.trackFront() : chassis.trackRear()) / 2;
    return wheel % 2 == 0 ? half : -half;
  }

  /**
   * Evaluates the motion.
   *
   * @param speed speed of the centre of gravity (m/s)
   * @param sideslip its direction in the body (rad)
   * @param yawRate yaw rate (rad/s)
   * @param steer angle of the front wheels (rad)
   * @param specificX force of the road per mass along the body (m/s²), which sets the wheel loads
   * @param specificY the same across the body
   * @param slips longitudinal slips
   */
  Motion at(
      double speed,
      double sideslip,
      double yawRate,
      double steer,
      double specificX,
      double specificY,
      double[] slips) {
    double pressure = 0.5 * conditions.airDensity() * speed * speed;
    loads.update(
        specificX,
        specificY,
        WheelLoads.GRAVITY,
        0,
        pressure * car.aero().downforceAreaFront(),
        0,
        pressure * car.aero().downforceAreaRear(),
        0);
    Motion m = new Motion();
    TyreForces tyreForces = new TyreForces();
    for (int i = 0; i < 4; i++) {
      double vx = speed * Math.cos(sideslip) - yawRate * wheelY(i);
      double vy = speed * Math.sin(sideslip) + yawRate * wheelX(i);
      double turned = i < 2 ? steer : 0;
      double along = vx * Math.cos(turned) + vy * Math.sin(turned);
      double across = -vx * Math.sin(turned) + vy * Math.cos(turned);
      m.slipAngle[i] = Math.atan2(across, along);
      m.wheelSpeed[i] = along * (1 + slips[i]) / radius(i);
      m.load[i] = loads.load(i);
      Tyre tyre = i < 2 ? car.frontTyre() : car.rearTyre();
      tyre.evaluate(m.load[i], slips[i], m.slipAngle[i], conditions.grip(), tyreForces);
      m.fx[i] = tyreForces.fx;
      m.fy[i] = tyreForces.fy;
      m.torque[i] = tyreForces.fx * radius(i);
      double bodyX = m.fx[i] * Math.cos(turned) - m.fy[i] * Math.sin(turned);
      double bodyY = m.fx[i] * Math.sin(turned) + m.fy[i] * Math.cos(turned);
      m.forceX += bodyX;
      m.forceY += bodyY;
      m.yawMoment += wheelX(i) * bodyY - wheelY(i) * bodyX;
    }
    return m;
  }
}
