/** Engine, gears and the layout of the driven axles: what torque reaches a differential's case. */
package rampwright.vehicle.driveline;
