package rampwright.vehicle.lap;

import java.util.ArrayList;
import java.util.List;
import rampwright.vehicle.chassis.Wheel;
import rampwright.vehicle.trim.DifferentialState;
import rampwright.vehicle.trim.Trim;
import rampwright.vehicle.trim.WheelState;

/** The trims that a lap's trace tells, station by station; without brake-based locks. */
final class TraceTrims {
  private TraceTrims() {}

  static Trim at(Lap lap, int i) {
    Trace t = lap.trace();
    List<WheelState> wheels = new ArrayList<>();
    for (Wheel wheel : Wheel.values()) {
      int w = wheel.ordinal();
      wheels.add(
          new WheelState(
              wheel,
              block(t, Channel.FX_FL, w, i),
              block(t, Channel.FY_FL, w, i),
              block(t, Channel.FZ_FL, w, i),
              block(t, Channel.SLIP_FL, w, i),
              block(t, Channel.SLIP_ANGLE_FL, w, i),
              block(t, Channel.WHEEL_SPEED_FL, w, i)));
    }
    return new Trim(
        t.get(Channel.SPEED, i),
        t.get(Channel.CURVATURE, i),
        t.get(Channel.CURVATURE_GRADIENT, i),
        t.get(Channel.SIDESLIP, i),
        t.get(Channel.STEER, i),
        t.get(Channel.AX, i),
        t.get(Channel.AY, i),
        t.get(Channel.CAGE_TORQUE, i),
        t.get(Channel.BRAKE_TORQUE, i),
        List.of(differential(t, 0, i), differential(t, 8, i)),
        differential(t, 4, i),
        t.get(Channel.YAW_MOMENT, i),
        t.get(Channel.SIGMA, i),
        wheels);
  }

  private static double block(Trace t, Channel first, int offset, int i) {
    return t.get(Channel.values()[first.ordinal() + offset], i);
  }

  private static DifferentialState differential(Trace t, int offset, int i) {
    double speed = block(t, Channel.FRONT_SPEED_DIFFERENCE, offset, i);
    double capacity = block(t, Channel.FRONT_CAPACITY, offset, i);
    double difference = block(t, Channel.FRONT_TORQUE_DIFFERENCE, offset, i);
    boolean sticking = capacity > 0 && speed < 1e-5;
    return new DifferentialState(
        block(t, Channel.FRONT_CAGE_TORQUE, offset, i), difference, speed, capacity, sticking, 0);
  }
}
