package rampwright.vehicle.balance;

/**
 * Measures of one phase of one corner. Means are over time.
 *
 * @param phase which phase
 * @param firstStation first station of the phase
 * @param endStation station after the last; smaller than {@code firstStation} when the phase runs
 *     over the start line
 * @param start distance at which it starts (m)
 * @param length its length (m)
 * @param time time spent in it (s)
 * @param entrySpeed speed at its start (m/s)
 * @param exitSpeed speed at its end (m/s)
 * @param meanAx mean longitudinal acceleration (m/s²)
 * @param tractionLimitedShare share of the time in which tyres or driver, not the engine, limit the
 *     drive (-)
 * @param peakInnerSlip largest longitudinal slip of the inner driven wheel (-)
 * @param meanTorqueDifference mean torque difference of the driven axle (N·m)
 * @param lockedShare share of the time in which the differential's outputs stick together (-)
 * @param meanUndersteerAngle mean of steer minus kinematic angle, positive understeer (rad)
 * @param meanYawMoment mean differential yaw moment, positive turns the car out of the corner (N·m)
 * @param peakSigma largest slide growth rate (1/s)
 * @param peakSigmaDistance where it is reached (m)
 * @param leastControl least control (-)
 * @param plateEnergy energy turned into heat in the differentials (J)
 * @param peakPlatePower largest sliding power in the differentials (W)
 * @param tyreWorkFront sliding work of the front tyres (J)
 * @param tyreWorkRear sliding work of the rear tyres (J)
 */
public record PhaseReport(
    Phase phase,
    int firstStation,
    int endStation,
    double start,
    double length,
    double time,
    double entrySpeed,
    double exitSpeed,
    double meanAx,
    double tractionLimitedShare,
    double peakInnerSlip,
    double meanTorqueDifference,
    double lockedShare,
    double meanUndersteerAngle,
    double meanYawMoment,
    double peakSigma,
    double peakSigmaDistance,
    double leastControl,
    double plateEnergy,
    double peakPlatePower,
    double tyreWorkFront,
    double tyreWorkRear) {}
