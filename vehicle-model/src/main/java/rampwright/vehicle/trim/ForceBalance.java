package rampwright.vehicle.trim;

import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.Chassis;
import rampwright.vehicle.chassis.WheelLoads;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.tyre.Tyre;
import rampwright.vehicle.tyre.TyreForces;

/**
 * Forces on the four wheels of a car at one point of the road, and how they change in any direction
 * of the state. A workspace, one instance per thread: {@link #place}, then {@link #evaluate}, then
 * {@link #direction} and {@link #slipDirection} as often as needed.
 *
 * <p>The state is: speed {@code v}, sideslip {@code beta}, yaw rate over speed {@code k} (1/m),
 * road-wheel steer {@code delta}, the road's specific forces {@code fx, fy} in body axes (which set
 * the wheel loads) and the four longitudinal slips.
 *
 * <p>Results stand in {@link #value} and, per direction, in {@link #change}: body-axis sums of the
 * tyre forces X, Y (N), yaw moment M (N·m), torques T that the driveline brings to the wheels (N·m)
 * and wheel speeds (rad/s).
 */
final class ForceBalance {
  static final int X = 0;
  static final int Y = 1;
  static final int M = 2;
  static final int TORQUE = 3;
  static final int SPEED = 7;
  static final int SIZE = 11;

  final double[] value = new double[SIZE];
  final double[] change = new double[SIZE];

  final double mass;
  final double weight;
  final double wheelbase;
  final double yawInertia;
  final TyreForces[] tyre = {
    new TyreForces(), new TyreForces(), new TyreForces(), new TyreForces()
  };
  final double[] slipAngle = new double[4];
  final WheelLoads loads;
  final WheelBrakes wheelBrakes;

  private final Tyre[] tyres;
  private final double[] radius;
  private final double[] wheelX;
  private final double[] wheelY;
  private final double dynamicPressure;
  private final double dragFactor;
  private final double downFrontFactor;
  private final double downRearFactor;
  private final double conditionsGrip;

  // the point of the road
  double curvature;
  double curvatureGradient;
  private double sinGrade;
  private double cosGrade;
  private double sinBank;
  private double cosBank;
  private double verticalCurvature;
  private double headwind;
  private final double[] grip = new double[4];

  // the state of the last evaluation that the directions need
  private double speed;
  private double cosSteer;
  private double sinSteer;
  private double sinBeta;
  private double cosBeta;
  private final double[] slip = new double[4];
  private final double[] along = new double[4];
  private final double[] across = new double[4];
  private final double[] angleByBeta = new double[4];
  private final double[] angleByK = new double[4];

  ForceBalance(Car car, Conditions conditions, DifferentialSet differentials) {
    Chassis chassis = car.chassis().withAddedMass(conditions.fuelMass());
    this.mass = chassis.mass();
    this.weight = mass * WheelLoads.GRAVITY;
    this.wheelbase = chassis.wheelbase();
    this.yawInertia = chassis.yawInertia();
    this.loads = new WheelLoads(chassis);
    this.tyres = new Tyre[] {car.frontTyre(), car.frontTyre(), car.rearTyre(), car.rearTyre()};
    this.radius =
        new double[] {car.frontRadius(), car.frontRadius(), car.rearRadius(), car.rearRadius()};
    double a = chassis.cgToFrontAxle();
    double b = chassis.cgToRearAxle();
    this.wheelX = new double[] {a, a, -b, -b};
    double halfFront = chassis.trackFront() / 2;
    double halfRear = chassis.trackRear() / 2;
    this.wheelY = new double[] {halfFront, -halfFront, halfRear, -halfRear};
    this.dynamicPressure = 0.5 * conditions.airDensity();
    this.dragFactor = dynamicPressure * car.aero().dragArea();
    this.downFrontFactor = dynamicPressure * car.aero().downforceAreaFront();
    this.downRearFactor = dynamicPressure * car.aero().downforceAreaRear();
    this.conditionsGrip = conditions.grip();
    this.wheelBrakes = new WheelBrakes(car.driveline().layout(), differentials);
  }

  /** Moves to a point of the road. */
  void place(
      double curvature,
      double curvatureGradient,
      double grade,
      double bank,
      double verticalCurvature,
      double gripLeft,
      double gripRight,
      double headwind) {
    this.curvature = curvature;
    this.curvatureGradient = curvatureGradient;
    this.sinGrade = Math.sin(grade);
    this.cosGrade = Math.cos(grade);
    this.sinBank = Math.sin(bank);
    this.cosBank = Math.cos(bank);
    this.verticalCurvature = verticalCurvature;
    this.headwind = headwind;
    grip[0] = conditionsGrip * gripLeft;
    grip[1] = conditionsGrip * gripRight;
    grip[2] = grip[0];
    grip[3] = grip[1];
  }

  /** Bends the path at the same point of the road. */
  void bend(double newCurvature, double newGradient) {
    this.curvature = newCurvature;
    this.curvatureGradient = newGradient;
  }

  double radius(int wheel) {
    return radius[wheel];
  }

  double wheelY(int wheel) {
    return wheelY[wheel];
  }

  Tyre tyreModel(int wheel) {
    return tyres[wheel];
  }

  /** Returns the drag (N) against the path at a speed. */
  double drag(double v) {
    double air = v + headwind;
    return dragFactor * air * Math.abs(air);
  }

  /** Returns the specific force (m/s²) that the road supplies along the path. */
  double tangential(double v, double ax) {
    return ax + drag(v) / mass + WheelLoads.GRAVITY * sinGrade;
  }

  /** Returns the derivative of {@link #tangential} with speed. */
  double tangentialBySpeed(double v) {
    return 2 * dragFactor * Math.abs(v + headwind) / mass;
  }

  /** Returns the specific force (m/s²) that the road supplies across the path. */
  double normal(double v) {
    return v * v * curvature * cosBank - WheelLoads.GRAVITY * sinBank;
  }

  /** Returns the derivative of {@link #normal} with speed. */
  double normalBySpeed(double v) {
    return 2 * v * curvature * cosBank;
  }

  /**
   * Evaluates everything; sideslip comes as sine and cosine, the rest as described at the class.
   */
  void evaluate(
      double v,
      double sineBeta,
      double cosineBeta,
      double k,
      double delta,
      double fx,
      double fy,
      double[] slips) {
    speed = v;
    sinBeta = sineBeta;
    cosBeta = cosineBeta;
    sinSteer = Math.sin(delta);
    cosSteer = Math.cos(delta);
    double vertical = curvature * sinBank + verticalCurvature;
    double air = v + headwind;
    double pressure = air * air;
    double pressureBySpeed = 2 * air;
    loads.update(
        fx,
        fy,
        WheelLoads.GRAVITY * cosBank * cosGrade + v * v * vertical,
        2 * v * vertical,
        downFrontFactor * pressure,
        downFrontFactor * pressureBySpeed,
        downRearFactor * pressure,
        downRearFactor * pressureBySpeed);
    wheelBrakes.update(slips);
    double sumX = 0;
    double sumY = 0;
    double sumM = 0;
    for (int i = 0; i < 4; i++) {
      double a = cosBeta - k * wheelY[i];
      double b = sinBeta + k * wheelX[i];
      double perSquare = 1 / (a * a + b * b);
      angleByBeta[i] = (a * cosBeta + b * sinBeta) * perSquare;
      angleByK[i] = (a * wheelX[i] + b * wheelY[i]) * perSquare;
      double angle = Math.atan2(b, a);
      TyreForces f = tyre[i];
      slip[i] = slips[i];
      double forceX;
      double forceY;
      if (i < 2) {
        slipAngle[i] = angle - delta;
        along[i] = a * cosSteer + b * sinSteer;
        across[i] = b * cosSteer - a * sinSteer;
        tyres[i].evaluate(loads.load(i), slip[i], slipAngle[i], grip[i], f);
        forceX = f.fx * cosSteer - f.fy * sinSteer;
        forceY = f.fx * sinSteer + f.fy * cosSteer;
      } else {
        slipAngle[i] = angle;
        along[i] = a;
        across[i] = b;
        tyres[i].evaluate(loads.load(i), slip[i], slipAngle[i], grip[i], f);
        forceX = f.fx;
        forceY = f.fy;
      }
      sumX += forceX;
      sumY += forceY;
      sumM += wheelX[i] * forceY - wheelY[i] * forceX;
      value[TORQUE + i] = f.fx * radius[i] + wheelBrakes.torque(i);
      value[SPEED + i] = v * along[i] * (1 + slip[i]) / radius[i];
    }
    value[X] = sumX;
    value[Y] = sumY;
    value[M] = sumM;
  }

  /** Computes the change of every result when the state moves at the given rates. */
  void direction(double dBeta, double dK, double dDelta, double dFx, double dFy, double dSpeed) {
    double sumX = 0;
    double sumY = 0;
    double sumM = 0;
    for (int i = 0; i < 4; i++) {
      TyreForces f = tyre[i];
      double dAngle = angleByBeta[i] * dBeta + angleByK[i] * dK;
      double da = -sinBeta * dBeta - wheelY[i] * dK;
      double db = cosBeta * dBeta + wheelX[i] * dK;
      double dLoad = loads.byFx(i) * dFx + loads.byFy(i) * dFy + loads.bySpeed(i) * dSpeed;
      double dX;
      double dY;
      double dAlong;
      double dForce;
      if (i < 2) {
        dAngle -= dDelta;
        dForce = f.fxAngle * dAngle + f.fxLoad * dLoad;
        double dSide = f.fyAngle * dAngle + f.fyLoad * dLoad;
        dX = dForce * cosSteer - dSide * sinSteer - (f.fx * sinSteer + f.fy * cosSteer) * dDelta;
        dY = dForce * sinSteer + dSide * cosSteer + (f.fx * cosSteer - f.fy * sinSteer) * dDelta;
        dAlong = da * cosSteer + db * sinSteer + across[i] * dDelta;
      } else {
        dForce = f.fxAngle * dAngle + f.fxLoad * dLoad;
        dX = dForce;
        dY = f.fyAngle * dAngle + f.fyLoad * dLoad;
        dAlong = da;
      }
      sumX += dX;
      sumY += dY;
      sumM += wheelX[i] * dY - wheelY[i] * dX;
      change[TORQUE + i] = dForce * radius[i];
      change[SPEED + i] = (speed * dAlong + dSpeed * along[i]) * (1 + slip[i]) / radius[i];
    }
    change[X] = sumX;
    change[Y] = sumY;
    change[M] = sumM;
  }

  /** Computes the change of every result with the slip of one wheel. */
  void slipDirection(int wheel) {
    TyreForces f = tyre[wheel];
    double dX = f.fxSlip;
    double dY = f.fySlip;
    if (wheel < 2) {
      dX = f.fxSlip * cosSteer - f.fySlip * sinSteer;
      dY = f.fxSlip * sinSteer + f.fySlip * cosSteer;
    }
    change[X] = dX;
    change[Y] = dY;
    change[M] = wheelX[wheel] * dY - wheelY[wheel] * dX;
    for (int i = 0; i < 4; i++) {
      change[TORQUE + i] = wheelBrakes.bySlip(i, wheel);
      change[SPEED + i] = 0;
    }
    change[TORQUE + wheel] += f.fxSlip * radius[wheel];
    change[SPEED + wheel] = speed * along[wheel] / radius[wheel];
  }
}
