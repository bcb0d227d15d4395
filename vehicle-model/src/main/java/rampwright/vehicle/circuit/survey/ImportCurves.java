package rampwright.vehicle.circuit.survey;

import java.util.Optional;

/**
 * What a file held, beside the circuit that came from it.
 *
 * @param rawCurvature curvature (1/m) over distance (m) before smoothing and closing
 * @param speed logged speed (m/s) over distance (m)
 * @param positions measured positions (m) in the axes of the circuit
 */
public record ImportCurves(Curve rawCurvature, Optional<Curve> speed, Optional<Curve> positions) {}
