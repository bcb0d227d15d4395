package rampwright.web.work;

import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;

/**
 * What a lap shows over its distance, in the units of a screen. The differential is the one that
 * the parts kit is for: in the front axle of a front-wheel-drive car, else in the rear axle.
 */
public final class LapTrace {
  private final Lap lap;
  private final boolean front;

  /** Reads a lap. */
  public LapTrace(Lap lap) {
    this.lap = lap;
    this.front = lap.request().car().driveline().layout() == DriveLayout.FRONT;
  }

  /** Returns the distance of each station (m). */
  public double[] distance() {
    return lap.trace().column(Channel.DISTANCE);
  }

  /** Returns the speed (km/h). */
  public double[] speed() {
    return each(i -> 3.6 * at(Channel.SPEED, i));
  }

  /** Returns the torque difference of the differential (N·m), slower minus faster wheel. */
  public double[] torqueDifference() {
    Channel channel = front ? Channel.FRONT_TORQUE_DIFFERENCE : Channel.REAR_TORQUE_DIFFERENCE;
    return lap.trace().column(channel);
  }

  /** Returns the cage torque of the differential (N·m). */
  public double[] cageTorque() {
    return lap.trace().column(front ? Channel.FRONT_CAGE_TORQUE : Channel.REAR_CAGE_TORQUE);
  }

  /** Returns the speed difference of the outputs (rad/s), faster minus slower. */
  public double[] speedDifference() {
    return lap.trace()
        .column(front ? Channel.FRONT_SPEED_DIFFERENCE : Channel.REAR_SPEED_DIFFERENCE);
  }

  /** Returns the yaw moment of the differentials (N·m), positive out of the corner. */
  public double[] yawMoment() {
    return lap.trace().column(Channel.YAW_MOMENT);
  }

  /** Returns the growth rate of a slide (1/s); negative where it dies away. */
  public double[] growth() {
    return lap.trace().column(Channel.SIGMA);
  }

  /** Returns the longitudinal slip (%) of the wheel of the axle that turns inside the curve. */
  public double[] innerSlip() {
    Channel left = front ? Channel.SLIP_FL : Channel.SLIP_RL;
    Channel right = front ? Channel.SLIP_FR : Channel.SLIP_RR;
    return each(i -> 100 * at(at(Channel.CURVATURE, i) >= 0 ? left : right, i));
  }

  private double at(Channel channel, int station) {
    return lap.trace().get(channel, station);
  }

  private double[] each(IntToDoubleFunction value) {
    return IntStream.range(0, lap.trace().stations()).mapToDouble(value).toArray();
  }
}
