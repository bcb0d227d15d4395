package rampwright.vehicle.balance;

/**
 * Temperatures of one unit at one moment.
 *
 * @param plates mean temperature of the plates (°C)
 * @param oil temperature of oil and case (°C)
 */
public record PlateTemperature(double plates, double oil) {}
