package rampwright.vehicle.balance;

/**
 * A corner of a road.
 *
 * @param number 1 for the first that begins after the start line
 * @param left whether it turns left
 * @param first first station at which the road bends
 * @param count number of stations that bend; the corner may run over the start line
 * @param tightest station of the largest curvature
 * @param turning change of heading (rad), not negative
 */
public record Corner(
    int number, boolean left, int first, int count, int tightest, double turning) {}
