/** The event: car, circuits, kit, conditions, driver, limits and the settings under discussion. */
package rampwright.optimiser.event;
