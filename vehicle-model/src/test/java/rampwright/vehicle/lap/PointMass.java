package rampwright.vehicle.lap;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import rampwright.vehicle.Car;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.driveline.DriveLayout;

/**
 * The real solver's car made as like a point mass as its records allow: centre of gravity on the
 * ground (so no load transfer), the least wheelbase, track and yaw inertia, all wheels driven and
 * braked alike, and tyres with the same friction at every load and in every direction. Then every
 * wheel reaches its peak at once, and what the car can do is the friction circle. What is left of
 * the car is wheelbase and track over the radius, a few parts in ten thousand.
 */
final class PointMass {
  static final double AIR = Conditions.STANDARD.airDensity();

  private PointMass() {}

  /**
   * Returns the parts of such a car.
   *
   * @param mass mass (kg)
   * @param friction friction (-)
   * @param power power at the wheels (W)
   * @param drag drag over speed squared (N·s²/m²)
   * @param downforce downforce over speed squared (N·s²/m²)
   */
  static CarBuilder parts(
      double mass, double friction, double power, double drag, double downforce) {
    CarBuilder b = new CarBuilder();
    b.mass = mass;
    b.yawInertia = 5;
    b.wheelbase = 0.8;
    b.cgToFrontAxle = 0.4;
    b.cgHeight = 0;
    b.trackFront = 0.5;
    b.trackRear = 0.5;
    b.rollCentreFront = 0;
    b.rollCentreRear = 0;
    b.frontRollShare = 0.5;
    b.dragArea = 2 * drag / AIR;
    b.downforceFront = downforce / AIR;
    b.downforceRear = downforce / AIR;
    b.brakeFrontShare = 0.5;
    b.brakeTorque = 1e6;
    b.layout = DriveLayout.ALL;
    b.frontTorqueShare = 0.5;
    b.frontRadius = 0.3;
    b.rearRadius = 0.3;
    b.efficiency = 1;
    b.gears = List.of(1.0);
    b.finalDrive = 1;
    b.engine = CarBuilder.strongestAt(power, 19_000, 400);
    b.front = CarBuilder.even(friction, 0.05, 1.6);
    b.rear = b.front;
    return b;
  }

  /** Returns a lap at the car's own limits with open differentials. */
  static Lap lap(Car car, Circuit circuit, double spacing) {
    OpenDifferential open = OpenDifferential.IDEAL;
    return LapSolver.solve(
        new LapRequest(
            car,
            new DifferentialSet(open, open, open),
            Conditions.STANDARD,
            Driver.QUICK,
            LimitForm.CAR,
            circuit,
            spacing));
  }

  /** Returns a line with a curvature (1/m) over distance (m); positions are of no account here. */
  static Circuit line(boolean closed, double length, double step, DoubleUnaryOperator curvature) {
    List<Station> stations = new ArrayList<>();
    int n = (int) Math.round(length / step);
    for (int i = 0; i < (closed ? n : n + 1); i++) {
      double s = length * i / n;
      stations.add(Station.flat(s, curvature.applyAsDouble(s), s, 0));
    }
    return new Circuit("line of a test", closed, length, stations);
  }

  /**
   * Returns an open run that begins slowly, since an open run starts at the speed that its first
   * station allows: there the grip is a twentieth and the radius 20 m. The rest has one curvature.
   */
  static Circuit slowStart(double length, double step, double curvature) {
    List<Station> stations = new ArrayList<>();
    int n = (int) Math.round(length / step);
    for (int i = 0; i <= n; i++) {
      double s = length * i / n;
      boolean slow = i < 3;
      double grip = slow ? 0.05 : 1;
      stations.add(new Station(s, slow ? 0.05 : curvature, s, 0, 0, 0, grip, grip));
    }
    return new Circuit("slow start", false, length, stations);
  }

  /**
   * Returns two straights (m) and two left half circles (m), the curvature averaged per station.
   */
  static Circuit oval(double radius, double straight, int stations) {
    double length = 2 * straight + 2 * Math.PI * radius;
    double step = length / stations;
    return line(
        true,
        length,
        step,
        s -> {
          double covered = 0;
          for (int half = -1; half <= 2; half++) {
            double from = half * length / 2 + straight / 2;
            double to = from + Math.PI * radius;
            covered += Math.max(0, Math.min(s + step / 2, to) - Math.max(s - step / 2, from));
          }
          return covered / step / radius;
        });
  }
}
