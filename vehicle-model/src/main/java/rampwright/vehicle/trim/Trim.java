package rampwright.vehicle.trim;

import java.util.List;

/**
 * A steady state of the car at one point of the road.
 *
 * @param speed speed along the path (m/s)
 * @param curvature path curvature (1/m)
 * @param curvatureGradient change of curvature along the path (1/m²)
 * @param sideslip sideslip angle (rad)
 * @param steer road-wheel steer angle of the front wheels (rad)
 * @param ax acceleration along the path (m/s²)
 * @param ay acceleration across the path, {@code v² kappa} (m/s²)
 * @param cageTorque torque into the (centre) differential's case (N·m)
 * @param brakeTorque total service brake torque of all wheels (N·m), not negative
 * @param axles the differential of each axle, front then rear; an axle that is not driven is open
 *     with no torque
 * @param centre the centre differential, with front as its left output; no torque unless all wheels
 *     are driven
 * @param yawMomentDifferential yaw moment of unequal longitudinal forces on the driven axles (N·m),
 *     signed so that positive turns the car out of the corner
 * @param sigma largest real part of the two eigenvalues of sideslip and yaw rate (1/s)
 * @param wheels the four wheels in the order of {@link rampwright.vehicle.chassis.Wheel}
 */
public record Trim(
    double speed,
    double curvature,
    double curvatureGradient,
    double sideslip,
    double steer,
    double ax,
    double ay,
    double cageTorque,
    double brakeTorque,
    List<DifferentialState> axles,
    DifferentialState centre,
    double yawMomentDifferential,
    double sigma,
    List<WheelState> wheels) {
  /** Copies the lists. */
  public Trim {
    axles = List.copyOf(axles);
    wheels = List.copyOf(wheels);
  }

  /** Returns the state of one wheel by its position in the fixed order. */
  public WheelState wheel(rampwright.vehicle.chassis.Wheel wheel) {
    return wheels.get(wheel.ordinal());
  }
}
