package rampwright.vehicle.balance;

import java.util.List;

/**
 * One corner of a lap.
 *
 * @param number 1 for the first after the start line
 * @param left whether it turns left
 * @param apexDistance distance of the slowest point (m)
 * @param slowestSpeed speed there (m/s)
 * @param time time of all its phases (s); the times of all corners add up to the lap time
 * @param fullThrottleDistance distance from the slowest point to full power (m); NaN when the next
 *     braking comes first
 * @param phases its phases in driving order; empty phases are left out
 */
public record CornerReport(
    int number,
    boolean left,
    double apexDistance,
    double slowestSpeed,
    double time,
    double fullThrottleDistance,
    List<PhaseReport> phases) {
  /** Copies the phases. */
  public CornerReport {
    phases = List.copyOf(phases);
  }
}
