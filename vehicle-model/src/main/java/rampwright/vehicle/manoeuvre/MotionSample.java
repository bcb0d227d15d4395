package rampwright.vehicle.manoeuvre;

/**
 * The motion at one moment.
 *
 * @param time time (s)
 * @param state speeds and yaw rate
 * @param ax acceleration along the path (m/s²)
 * @param ay acceleration across the path (m/s²), positive to the left
 * @param yawMomentDifferential yaw moment of unequal longitudinal forces on the driven axles (N·m),
 *     positive to the left
 * @param cageTorque torque into the (centre) differential's case (N·m)
 * @param steer road-wheel steer angle (rad)
 */
public record MotionSample(
    double time,
    MotionState state,
    double ax,
    double ay,
    double yawMomentDifferential,
    double cageTorque,
    double steer) {}
