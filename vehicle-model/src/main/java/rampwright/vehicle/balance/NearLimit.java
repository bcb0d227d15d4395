package rampwright.vehicle.balance;

/**
 * A critical point of a corner, at the limit and a little below it.
 *
 * @param corner number of the corner
 * @param phase phase to which the point belongs
 * @param distance where it is (m)
 * @param share share of the accelerations at the limit (-)
 * @param limitGrowth growth rate of a slide at the limit (1/s)
 * @param growth growth rate of a slide at that share of the limit (1/s); NaN where there is no such
 *     trim
 * @param limitUndersteer understeer angle at the limit (rad), positive understeer
 * @param understeer understeer angle at that share (rad); NaN where there is no such trim
 */
public record NearLimit(
    int corner,
    Phase phase,
    double distance,
    double share,
    double limitGrowth,
    double growth,
    double limitUndersteer,
    double understeer) {}
