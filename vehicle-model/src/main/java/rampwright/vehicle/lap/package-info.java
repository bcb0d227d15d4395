/** A lap: the fastest speed profile that the car, or the driver, can hold on a given line. */
package rampwright.vehicle.lap;
