package rampwright.optimiser.search;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import rampwright.vehicle.balance.LapReport;

/**
 * What the laps of one law say about it.
 *
 * @param lapTime sum of the circuits' lap times, each times its circuit's weight (s)
 * @param reports one per circuit, in the event's order
 */
record LapFigures(double lapTime, List<LapReport> reports) {
  /** Copies the list. */
  LapFigures {
    reports = List.copyOf(reports);
  }

  /** Returns the largest value over the circuits; nothing where no lap has one. */
  OptionalDouble worst(ToDoubleFunction<LapReport> value) {
    return reports.stream().mapToDouble(value).filter(v -> !Double.isNaN(v)).max();
  }

  /** Returns the largest rise (rad) of the exits' understeer angle over the circuits. */
  OptionalDouble understeerChange(LapFigures from) {
    double worst = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < reports.size(); i++) {
      double before = from.reports.get(i).exitUndersteerAngle();
      worst = Math.max(worst, reports.get(i).exitUndersteerAngle() - before);
    }
    return OptionalDouble.of(worst);
  }
}
