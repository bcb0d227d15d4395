/** Tyre force models. Knows nothing of cars; signs and units as in {@link rampwright.vehicle}. */
package rampwright.vehicle.tyre;
