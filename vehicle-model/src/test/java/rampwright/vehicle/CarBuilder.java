package rampwright.vehicle;

import java.util.ArrayList;
import java.util.List;
import rampwright.vehicle.chassis.Aero;
import rampwright.vehicle.chassis.Brakes;
import rampwright.vehicle.chassis.Chassis;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.driveline.Engine;
import rampwright.vehicle.driveline.TorqueCurve;
import rampwright.vehicle.tyre.PeakAtLoad;
import rampwright.vehicle.tyre.PeakSlipTyre;
import rampwright.vehicle.tyre.SlipCurve;
import rampwright.vehicle.tyre.Tyre;

/** An invented car for tests, in which any value can be replaced before it is built. */
public final class CarBuilder {
  public double mass = 1180;
  public double yawInertia = 1750;
  public double wheelbase = 2.68;
  public double cgToFrontAxle = 1.31;
  public double cgHeight = 0.45;
  public double trackFront = 1.61;
  public double trackRear = 1.59;
  public double rollCentreFront = 0.05;
  public double rollCentreRear = 0.09;
  public double frontRollShare = 0.57;
  public double dragArea = 0.88;
  public double downforceFront = 0.45;
  public double downforceRear = 0.75;
  public double brakeFrontShare = 0.63;
  public double brakeTorque = 9000;
  public DriveLayout layout = DriveLayout.REAR;
  public double frontTorqueShare = 0.5;
  public double frontRadius = 0.318;
  public double rearRadius = 0.318;
  public double efficiency = 0.92;
  public double shiftTime = 0;
  public List<Double> gears = List.of(2.92, 2.16, 1.70, 1.39, 1.18, 1.02);
  public double finalDrive = 3.70;
  public Engine engine = strongestAt(250_000, 330, 890);
  public Tyre front = loadSensitive();
  public Tyre rear = loadSensitive();

  /** Returns the car. */
  public Car build() {
    return new Car(
        "car of a test",
        new Chassis(
            mass,
            yawInertia,
            wheelbase,
            cgToFrontAxle,
            cgHeight,
            trackFront,
            trackRear,
            rollCentreFront,
            rollCentreRear,
            frontRollShare),
        new Aero(dragArea, downforceFront, downforceRear),
        new Brakes(brakeFrontShare, brakeTorque),
        new Driveline(engine, gears, finalDrive, efficiency, shiftTime, layout, frontTorqueShare),
        front,
        rear,
        frontRadius,
        rearRadius);
  }

  /** Returns a racing tyre that grips less per newton when it is loaded. */
  public static Tyre loadSensitive() {
    return new PeakSlipTyre(
        new PeakAtLoad(2000, 1.58, 1.55, 0.105, Math.toRadians(7)),
        new PeakAtLoad(5000, 1.42, 1.40, 0.115, Math.toRadians(8)),
        SlipCurve.peakAtOne(1.6),
        SlipCurve.peakAtOne(1.6));
  }

  /** Returns a tyre with the same friction in every direction and at every load. */
  public static Tyre even(double friction, double slipAtPeak, double shape) {
    PeakAtLoad light = new PeakAtLoad(1000, friction, friction, slipAtPeak, slipAtPeak);
    PeakAtLoad heavy = new PeakAtLoad(5000, friction, friction, slipAtPeak, slipAtPeak);
    SlipCurve curve = SlipCurve.peakAtOne(shape);
    return new PeakSlipTyre(light, heavy, curve, curve);
  }

  /** Returns an engine without overrun torque: constant torque, then constant power (W). */
  public static Engine strongestAt(double power, double torque, double revLimit) {
    List<TorqueCurve.Point> points = new ArrayList<>();
    double corner = power / torque;
    points.add(new TorqueCurve.Point(0, torque));
    // the chord of 1/speed over steps of half a percent is good to 3e-6
    for (double speed = corner; speed < 1.3 * revLimit; speed *= 1.005) {
      points.add(new TorqueCurve.Point(speed, power / speed));
    }
    return new Engine(
        new TorqueCurve(points),
        new TorqueCurve(List.of(new TorqueCurve.Point(0, 0), new TorqueCurve.Point(revLimit, 0))),
        revLimit);
  }
}
