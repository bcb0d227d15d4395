package rampwright.vehicle.trim;

import java.util.ArrayList;
import java.util.List;
import rampwright.vehicle.chassis.Wheel;

/**
 * Read-only view of everything that a solved trim says. It shows the trim that {@link
 * TrimSolver#restore} solved last and changes with the next one; {@link #toTrim} takes a copy.
 */
public final class TrimResults {
  private static final DifferentialState NONE = new DifferentialState(0, 0, 0, 0, false, 0);

  private final ForceBalance forces;
  private final DrivelineEquations driveline;
  private final boolean frontDriven;
  private final boolean rearDriven;
  private final Stability stability;
  private final TrimState state;

  TrimResults(
      ForceBalance forces,
      DrivelineEquations driveline,
      boolean frontDriven,
      boolean rearDriven,
      Stability stability,
      TrimState state) {
    this.forces = forces;
    this.driveline = driveline;
    this.frontDriven = frontDriven;
    this.rearDriven = rearDriven;
    this.stability = stability;
    this.state = state;
  }

  /** Returns the longitudinal force of a wheel in its own axes (N). */
  public double fx(int wheel) {
    return forces.tyre[wheel].fx;
  }

  /** Returns the lateral force of a wheel in its own axes (N). */
  public double fy(int wheel) {
    return forces.tyre[wheel].fy;
  }

  /** Returns the vertical load of a wheel (N). */
  public double fz(int wheel) {
    return forces.loads.load(wheel);
  }

  /** Returns the slip angle of a wheel (rad). */
  public double slipAngle(int wheel) {
    return forces.slipAngle[wheel];
  }

  /** Returns the speed of a wheel (rad/s). */
  public double wheelSpeed(int wheel) {
    return forces.value[ForceBalance.SPEED + wheel];
  }

  /** Returns the largest growth rate of a slide (1/s). */
  public double sigma() {
    return stability.sigma;
  }

  /** Returns the yaw moment gained per steer angle over m g L (-). */
  public double control() {
    return stability.control;
  }

  /** Returns the differential yaw moment (N·m), positive out of the corner. */
  public double yawMoment() {
    double moment = 0;
    if (frontDriven) {
      moment += (fx(1) - fx(0)) * forces.wheelY(0);
    }
    if (rearDriven) {
      moment += (fx(3) - fx(2)) * forces.wheelY(2);
    }
    return forces.curvature > 0 ? -moment : moment;
  }

  /** Returns the cage torque (N·m) of a position: 0 front, 1 centre, 2 rear. */
  public double cageTorque(int position) {
    DifferentialEquation d = at(position);
    return d == null ? 0 : d.cageTorque;
  }

  /** Returns the size of the torque difference (N·m) of a position. */
  public double torqueDifference(int position) {
    DifferentialEquation d = at(position);
    return d == null ? 0 : Math.abs(d.torqueDifference);
  }

  /** Returns the size of the output speed difference (rad/s) of a position. */
  public double speedDifference(int position) {
    DifferentialEquation d = at(position);
    return d == null ? 0 : Math.abs(d.speedDifference);
  }

  /** Returns the friction capacity (N·m) of a position. */
  public double capacity(int position) {
    DifferentialEquation d = at(position);
    return d == null ? 0 : d.capacity;
  }

  /** Returns a copy as an immutable trim. */
  public Trim toTrim() {
    List<WheelState> wheels = new ArrayList<>(4);
    for (Wheel wheel : Wheel.values()) {
      int i = wheel.ordinal();
      wheels.add(
          new WheelState(wheel, fx(i), fy(i), fz(i), state.slip[i], slipAngle(i), wheelSpeed(i)));
    }
    return new Trim(
        state.speed,
        forces.curvature,
        forces.curvatureGradient,
        state.sideslip,
        state.steer,
        state.ax,
        state.speed * state.speed * forces.curvature,
        state.cageTorque,
        state.brakeTorque,
        List.of(snapshot(0), snapshot(2)),
        snapshot(1),
        yawMoment(),
        sigma(),
        wheels);
  }

  private DifferentialState snapshot(int position) {
    DifferentialEquation d = at(position);
    return d == null ? NONE : d.snapshot(forces.wheelBrakes.ofPosition(position));
  }

  private DifferentialEquation at(int position) {
    return switch (position) {
      case 0 -> driveline.front;
      case 1 -> driveline.centre;
      default -> driveline.rear;
    };
  }
}
