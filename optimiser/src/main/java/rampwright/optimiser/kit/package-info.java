/** The parts kit in the drawer and the settings that can be built from it. */
package rampwright.optimiser.kit;
