/**
 * Differentials: the laws by which a cage torque is shared by two outputs, and the parts from which
 * a plate-type unit gets its law. Knows nothing of cars or tyres.
 */
package rampwright.vehicle.differential;
