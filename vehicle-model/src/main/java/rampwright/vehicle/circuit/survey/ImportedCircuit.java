package rampwright.vehicle.circuit.survey;

import rampwright.vehicle.circuit.Circuit;

/**
 * A circuit with the story of how it came from a file.
 *
 * @param circuit the circuit
 * @param report what was done
 * @param curves what the file held, for the plot
 */
public record ImportedCircuit(Circuit circuit, ImportReport report, ImportCurves curves) {}
