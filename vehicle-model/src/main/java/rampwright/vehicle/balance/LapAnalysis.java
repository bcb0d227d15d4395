package rampwright.vehicle.balance;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;

/**
 * Sums up a lap by corner and phase.
 *
 * <p>Times are differences of {@link Channel#TIME}, so phase times add up to the lap time. Means
 * are over time, with the value of a station holding until the next; energies follow the
 * trapezoidal rule. A corner's direction, not the sign of the local curvature, says which wheel is
 * the inner one and which sign understeer has.
 */
public final class LapAnalysis {
  private LapAnalysis() {}

  /**
   * Reports on a lap. On a road without corners the one entry has the number 0 and is a single
   * straight.
   */
  public static LapReport report(Lap lap) {
    PhaseMeasures measures = new PhaseMeasures(lap);
    List<Stretch> stretches = LapPhases.of(lap, Corners.of(lap.road()));
    List<CornerReport> corners = new ArrayList<>();
    List<PhaseReport> all = new ArrayList<>();
    int k = 0;
    while (k < stretches.size()) {
      Corner corner = stretches.get(k).corner();
      List<Stretch> own = new ArrayList<>();
      while (k < stretches.size() && stretches.get(k).corner() == corner) {
        own.add(stretches.get(k++));
      }
      List<PhaseReport> phases = own.stream().map(measures::report).toList();
      corners.add(cornerReport(lap, corner, own, phases));
      all.addAll(phases);
    }
    return summary(lap, measures, corners, all);
  }

  private static CornerReport cornerReport(
      Lap lap, Corner corner, List<Stretch> own, List<PhaseReport> phases) {
    int slowest = slowest(lap, corner, own);
    double time = phases.stream().mapToDouble(PhaseReport::time).sum();
    return new CornerReport(
        corner == null ? 0 : corner.number(),
        corner != null && corner.left(),
        slowest * lap.road().spacing(),
        lap.trace().get(Channel.SPEED, slowest),
        time,
        fullThrottleDistance(lap, slowest, own),
        phases);
  }

  /** Slowest station within the bend; of the whole road where there is no bend. */
  private static int slowest(Lap lap, Corner corner, List<Stretch> own) {
    int first = corner == null ? own.get(0).first() : corner.first();
    int count = corner == null ? own.get(0).count() : corner.count();
    int slowest = first;
    for (int k = 0; k < count; k++) {
      int i = (first + k) % lap.road().size();
      if (lap.trace().get(Channel.SPEED, i) < lap.trace().get(Channel.SPEED, slowest)) {
        slowest = i;
      }
    }
    return slowest;
  }

  private static double fullThrottleDistance(Lap lap, int slowest, List<Stretch> own) {
    Stretch last = own.get(own.size() - 1);
    if (last.phase() != Phase.STRAIGHT) {
      return Double.NaN;
    }
    if (own.stream().allMatch(s -> s.phase() == Phase.STRAIGHT)) {
      return 0;
    }
    return Math.floorMod(last.first() - slowest, lap.road().size()) * lap.road().spacing();
  }

  private static LapReport summary(
      Lap lap, PhaseMeasures measures, List<CornerReport> corners, List<PhaseReport> all) {
    List<PhaseReport> exits = all.stream().filter(p -> p.phase() == Phase.EXIT).toList();
    double exitTime = sum(exits, PhaseReport::time);
    double exitAngle = sum(exits, p -> p.meanUndersteerAngle() * p.time());
    return new LapReport(
        lap.time(),
        corners,
        measures.topSpeed(),
        sum(all, PhaseReport::plateEnergy),
        largest(all, PhaseReport::peakPlatePower, Phase.values()),
        sum(all, PhaseReport::tyreWorkFront),
        sum(all, PhaseReport::tyreWorkRear),
        exitTime > 0 ? exitAngle / exitTime : 0,
        largest(all, PhaseReport::peakSigma, Phase.BRAKING, Phase.ENTRY),
        largest(all, PhaseReport::peakSigma, Phase.APEX, Phase.EXIT),
        largest(exits, PhaseReport::peakInnerSlip, Phase.EXIT));
  }

  private static double sum(List<PhaseReport> phases, ToDoubleFunction<PhaseReport> value) {
    return phases.stream().mapToDouble(value).sum();
  }

  /** Largest value over some phases; NaN when a lap has none of them. */
  private static double largest(
      List<PhaseReport> phases, ToDoubleFunction<PhaseReport> value, Phase... which) {
    return phases.stream()
        .filter(p -> List.of(which).contains(p.phase()))
        .mapToDouble(value)
        .max()
        .orElse(Double.NaN);
  }
}
