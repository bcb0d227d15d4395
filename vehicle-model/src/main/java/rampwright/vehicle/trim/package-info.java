/**
 * The quasi-steady-state equilibrium of a car at one point of the road, its stability, and the
 * largest acceleration, braking and speed that it allows.
 */
package rampwright.vehicle.trim;
