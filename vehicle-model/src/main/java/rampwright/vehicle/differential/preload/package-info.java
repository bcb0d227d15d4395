/**
 * Preload springs of a plate-type unit: disc springs, stacks of them, and the shims that set what
 * the bench shows. Lengths in m, forces in N, torques in N·m, stresses in Pa. Knows the parts of
 * the unit, nothing of cars or tyres.
 */
package rampwright.vehicle.differential.preload;
