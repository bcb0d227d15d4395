/**
 * The road: a line with curvature, grade, bank and grip along its length, where it comes from and
 * how it is sampled for a lap. Signs as in {@link rampwright.vehicle}.
 */
package rampwright.vehicle.circuit;
