package rampwright.vehicle.balance;

import java.util.List;

/**
 * What a lap says about the car.
 *
 * @param lapTime lap time (s)
 * @param corners the corners in driving order; their times add up to the lap time
 * @param topSpeed highest speed (m/s)
 * @param plateEnergy energy turned into heat in the differentials over the lap (J)
 * @param peakPlatePower largest sliding power in the differentials (W)
 * @param tyreWorkFront sliding work of the front tyres over the lap (J)
 * @param tyreWorkRear sliding work of the rear tyres over the lap (J)
 * @param exitUndersteerAngle mean understeer angle over all exits, weighted by time (rad)
 * @param peakSigmaEntry largest slide growth rate in braking and entry (1/s), NaN without them
 * @param peakSigmaExit largest slide growth rate in apex and exit (1/s), NaN without them
 * @param peakInnerSlip largest slip of an inner driven wheel on exits (-), NaN without them
 */
public record LapReport(
    double lapTime,
    List<CornerReport> corners,
    double topSpeed,
    double plateEnergy,
    double peakPlatePower,
    double tyreWorkFront,
    double tyreWorkRear,
    double exitUndersteerAngle,
    double peakSigmaEntry,
    double peakSigmaExit,
    double peakInnerSlip) {
  /** Copies the corners. */
  public LapReport {
    corners = List.copyOf(corners);
  }
}
