/**
 * Where circuits come from: station files, surveyed lines and logged laps.
 *
 * <p>Units are turned into SI and signs into ISO 8855 while a file is read. Every fault is an
 * {@link rampwright.vehicle.input.InvalidInput} with file and line. May know {@link
 * rampwright.vehicle.circuit} only.
 */
package rampwright.vehicle.circuit.survey;
