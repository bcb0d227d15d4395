/** Mass, geometry, roll, aerodynamics and brakes of a car, and the wheel loads that follow. */
package rampwright.vehicle.chassis;
