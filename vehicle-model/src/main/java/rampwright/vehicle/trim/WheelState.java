package rampwright.vehicle.trim;

import rampwright.vehicle.chassis.Wheel;

/**
 * One wheel in a trim, in its own axes.
 *
 * @param wheel which wheel
 * @param fx longitudinal force (N)
 * @param fy lateral force (N), positive to the left
 * @param fz vertical load (N)
 * @param slip longitudinal slip (-)
 * @param slipAngle slip angle (rad)
 * @param speed rotational speed (rad/s)
 */
public record WheelState(
    Wheel wheel, double fx, double fy, double fz, double slip, double slipAngle, double speed) {}
