package rampwright.vehicle.manoeuvre;

import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.Chassis;
import rampwright.vehicle.chassis.WheelLoads;
import rampwright.vehicle.tyre.Tyre;
import rampwright.vehicle.tyre.TyreForces;

/**
 * Forces of a flat road on the car in any motion. Wheel loads follow the accelerations that the
 * tyre forces cause, and tyre forces follow the loads: both are found together by Newton's method,
 * so there is no lag and no roll or pitch motion. A workspace, one instance per thread.
 */
final class RoadForces {
  private static final int MOST_ITERATIONS = 50;

  /** Accelerations (m/s²) that miss each other by less are taken as equal. */
  private static final double CLOSE = 1e-9;

  /** Least speed of a wheel over ground (m/s) by which slip is divided. */
  private static final double LEAST_SPEED = 0.5;

  final double mass;
  final double yawInertia;
  final double[] fx = new double[4];
  final double[] slip = new double[4];

  /** Sum of the tyre forces along and across the body (N) and their yaw moment (N·m). */
  double forceX;

  double forceY;
  double yawMoment;

  /** Drag against the path (N). */
  double drag;

  private final Car car;
  private final Conditions conditions;
  private final WheelLoads loads;
  private final double[] wheelX;
  private final double[] wheelY;
  private final double[] angle = new double[4];
  private final TyreForces tyre = new TyreForces();
  private double xByFx;
  private double xByFy;
  private double yByFx;
  private double yByFy;

  RoadForces(Car car, Conditions conditions) {
    this.car = car;
    this.conditions = conditions;
    Chassis chassis = car.chassis().withAddedMass(conditions.fuelMass());
    this.mass = chassis.mass();
    this.yawInertia = chassis.yawInertia();
    this.loads = new WheelLoads(chassis);
    double a = chassis.cgToFrontAxle();
    double b = chassis.cgToRearAxle();
    double f = chassis.trackFront() / 2;
    double r = chassis.trackRear() / 2;
    this.wheelX = new double[] {a, a, -b, -b};
    this.wheelY = new double[] {f, -f, r, -r};
  }

  double radius(int wheel) {
    return wheel < 2 ? car.frontRadius() : car.rearRadius();
  }

  double halfTrack(int axle) {
    return wheelY[2 * axle];
  }

  /** Evaluates the forces in a state with the front wheels steered. */
  void evaluate(double[] y, double steer) {
    double vx = y[0];
    double vy = y[1];
    double yawRate = y[MotionState.YAW_RATE];
    double cos = Math.cos(steer);
    double sin = Math.sin(steer);
    for (int i = 0; i < 4; i++) {
      double a = vx - yawRate * wheelY[i];
      double b = vy + yawRate * wheelX[i];
      double along = i < 2 ? a * cos + b * sin : a;
      double across = i < 2 ? b * cos - a * sin : b;
      angle[i] = Math.atan2(across, along);
      slip[i] =
          (y[MotionState.WHEEL + i] * radius(i) - along) / Math.max(LEAST_SPEED, Math.abs(along));
    }
    double square = vx * vx + vy * vy;
    double pressure = 0.5 * conditions.airDensity() * square;
    drag = pressure * car.aero().dragArea();
    double downFront = pressure * car.aero().downforceAreaFront();
    double downRear = pressure * car.aero().downforceAreaRear();
    double ax = 0;
    double ay = yawRate * vx;
    for (int iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
      loads.update(ax, ay, WheelLoads.GRAVITY, 0, downFront, 0, downRear, 0);
      sum(cos, sin);
      double missX = forceX / mass - ax;
      double missY = forceY / mass - ay;
      if (Math.abs(missX) + Math.abs(missY) < CLOSE) {
        return;
      }
      double jxx = xByFx / mass - 1;
      double jxy = xByFy / mass;
      double jyx = yByFx / mass;
      double jyy = yByFy / mass - 1;
      double determinant = jxx * jyy - jxy * jyx;
      ax -= (missX * jyy - missY * jxy) / determinant;
      ay -= (missY * jxx - missX * jyx) / determinant;
    }
    throw new IllegalStateException("wheel loads and tyre forces found no balance");
  }

  private void sum(double cos, double sin) {
    forceX = 0;
    forceY = 0;
    yawMoment = 0;
    xByFx = 0;
    xByFy = 0;
    yByFx = 0;
    yByFy = 0;
    for (int i = 0; i < 4; i++) {
      Tyre model = i < 2 ? car.frontTyre() : car.rearTyre();
      model.evaluate(loads.load(i), slip[i], angle[i], conditions.grip(), tyre);
      fx[i] = tyre.fx;
      double c = i < 2 ? cos : 1;
      double s = i < 2 ? sin : 0;
      double x = tyre.fx * c - tyre.fy * s;
      double y = tyre.fx * s + tyre.fy * c;
      double xByLoad = tyre.fxLoad * c - tyre.fyLoad * s;
      double yByLoad = tyre.fxLoad * s + tyre.fyLoad * c;
      forceX += x;
      forceY += y;
      yawMoment += wheelX[i] * y - wheelY[i] * x;
      xByFx += xByLoad * loads.byFx(i);
      xByFy += xByLoad * loads.byFy(i);
      yByFx += yByLoad * loads.byFx(i);
      yByFy += yByLoad * loads.byFy(i);
    }
  }
}
