/**
 * The vehicle model: what a car can do at one point of a circuit and over a whole lap.
 *
 * <h2>Units</h2>
 *
 * SI throughout: m, s, kg, N, N·m, rad, rad/s, J, W; temperatures in °C. Other units exist only at
 * the edge of a file or a screen.
 *
 * <h2>Axes and signs (ISO 8855)</h2>
 *
 * x forward, y left, z up. A left turn has positive curvature, lateral acceleration, yaw rate and
 * road-wheel steer angle. The sideslip angle is {@code atan(vy/vx)} of the centre of gravity. A
 * tyre's slip angle is {@code atan(vy/vx)} in the wheel's own axes and its lateral force has the
 * opposite sign; longitudinal slip is {@code (omega*R - vx)/vx}, positive when driving. Wheels are
 * ordered front left, front right, rear left, rear right. The cage torque is what the ring gear
 * brings to a differential's case: positive drives the car, negative is overrun.
 *
 * <p>The torque difference {@code D} of a differential is always the whole difference between its
 * two outputs, slower minus faster. Some authors call half of it the locking torque; this code
 * never uses that word alone.
 */
package rampwright.vehicle;
