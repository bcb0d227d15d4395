package rampwright.vehicle.balance;

/**
 * A run of stations in one phase of one corner.
 *
 * @param corner the corner, or null on a road without corners
 * @param phase the phase
 * @param first first station
 * @param count number of stations; a stretch of a closed road may run over the start line
 */
record Stretch(Corner corner, Phase phase, int first, int count) {}
