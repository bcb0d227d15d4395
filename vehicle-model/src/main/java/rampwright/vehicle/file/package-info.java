/**
 * Cars and tyres as YAML text, and the strict reader that parts kits and events share.
 *
 * <p>Units are those of each {@link rampwright.vehicle.input.Quantity}: the unit stands in the key
 * ({@code mass_kg}) and values are turned into SI on the way in. Every fault is an {@link
 * rampwright.vehicle.input.InvalidInput} that names file, line and key; nothing is guessed and
 * nothing is left out silently: an unknown key is a fault.
 *
 * <p>May know every record of the vehicle model; none of them knows this package.
 */
package rampwright.vehicle.file;
