/**
 * The car on the circuit: records for its parts, the trim at one instant, the lap and its measures.
 *
 * <p>Units are SI throughout: m, kg, s, N, N·m, rad, W, K; a quantity in another unit says so in its
 * name. Knows no other module of Rampwright.
 */
package rampwright.vehicle;
