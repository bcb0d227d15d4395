/**
 * Invented circuits, logged laps, cars, tyres, kits and events as files, and bad inputs with the
 * message that each must give. Knows nothing of the model.
 */
package rampwright.samples;
