/**
 * The car in the time domain on a flat road: yaw rate, sideslip, speed and the four wheel speeds as
 * states, with the tyres, wheel loads and differentials of the trims. Serves as a transient check
 * of a setting and as a second opinion on the trims. May know everything of the vehicle model but
 * the lap and its measures. Units and signs as in {@link rampwright.vehicle}.
 */
package rampwright.vehicle.manoeuvre;
