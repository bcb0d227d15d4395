package rampwright.vehicle.balance;

import java.util.List;
import rampwright.vehicle.Car;
import rampwright.vehicle.chassis.Aero;
import rampwright.vehicle.chassis.Brakes;
import rampwright.vehicle.chassis.Chassis;
import rampwright.vehicle.chassis.WheelLoads;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.driveline.Engine;
import rampwright.vehicle.driveline.TorqueCurve;
import rampwright.vehicle.tyre.PeakAtLoad;
import rampwright.vehicle.tyre.PeakSlipTyre;
import rampwright.vehicle.tyre.SlipCurve;

/**
 * A car whose tyres have given stiffnesses at small slip. Stiffness is in proportion to load, so
 * the sum of an axle does not change with load transfer; there is no drag.
 */
final class LinearCar {
  static final double RADIUS = 0.3;
  static final double TRACK = 1.5;

  private static final double SHAPE = 1.5;

  /** Slip angle at the peak (rad): far away, so that the tyres are linear. */
  private static final double PEAK_ANGLE = 0.45;

  private LinearCar() {}

  /**
   * @param mass mass (kg)
   * @param inertia yaw inertia (kg·m²)
   * @param a centre of gravity to front axle (m)
   * @param b centre of gravity to rear axle (m)
   * @param front cornering stiffness of the front axle (N/rad)
   * @param rear cornering stiffness of the rear axle (N/rad)
   * @param slipStiffness longitudinal slip stiffness of each rear tyre (N)
   */
  static Car of(
      double mass,
      double inertia,
      double a,
      double b,
      double front,
      double rear,
      double slipStiffness) {
    double wheelbase = a + b;
    double frontLoad = mass * WheelLoads.GRAVITY * b / wheelbase / 2;
    double rearLoad = mass * WheelLoads.GRAVITY * a / wheelbase / 2;
    return new Car(
        "linear",
        new Chassis(mass, inertia, wheelbase, a, 0.3, TRACK, TRACK, 0, 0, 0.5),
        new Aero(0, 0, 0),
        new Brakes(0.6, 5000),
        driveline(),
        tyre(frontLoad, front / 2, slipStiffness),
        tyre(rearLoad, rear / 2, slipStiffness),
        RADIUS,
        RADIUS);
  }

  /** Stiffness at zero slip is {@code mu Fz Q S / (slip at peak)}. */
  private static PeakSlipTyre tyre(double load, double cornering, double slipStiffness) {
    SlipCurve curve = SlipCurve.peakAtOne(SHAPE);
    double slope = SHAPE * curve.scale() * load;
    double friction = PEAK_ANGLE * cornering / slope;
    double frictionX = Math.min(5, 0.5 * slipStiffness / slope);
    double slipAtPeak = frictionX * slope / slipStiffness;
    return new PeakSlipTyre(
        new PeakAtLoad(load / 2, frictionX, friction, slipAtPeak, PEAK_ANGLE),
        new PeakAtLoad(2 * load, frictionX, friction, slipAtPeak, PEAK_ANGLE),
        curve,
        curve);
  }

  private static Driveline driveline() {
    TorqueCurve full =
        new TorqueCurve(List.of(new TorqueCurve.Point(50, 300), new TorqueCurve.Point(800, 300)));
    TorqueCurve overrun =
        new TorqueCurve(List.of(new TorqueCurve.Point(50, -20), new TorqueCurve.Point(800, -60)));
    return new Driveline(
        new Engine(full, overrun, 800), List.of(2.0, 1.0), 3.5, 1, 0.1, DriveLayout.REAR, 0.5);
  }
}
