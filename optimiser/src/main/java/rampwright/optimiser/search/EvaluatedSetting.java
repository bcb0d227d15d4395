package rampwright.optimiser.search;

import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import rampwright.optimiser.event.LimitedMeasure;
import rampwright.optimiser.kit.KitSetting;
import rampwright.vehicle.differential.PlateDifferential;

/**
 * A setting with what the model says about it.
 *
 * @param setting what the crew fits
 * @param law what the lap sees of it
 * @param lapTime sum of the circuits' lap times, each times its circuit's weight (s)
 * @param measures every measure that a limit may stand on (SI); the worst of the circuits
 * @param limits the event's limits held against it, in the event's order
 * @param violation sum of the violations of all limits (-), zero when every limit is met
 */
public record EvaluatedSetting(
    KitSetting setting,
    PlateDifferential law,
    double lapTime,
    Map<LimitedMeasure, Double> measures,
    List<LimitCheck> limits,
    double violation) {
  /** Copies the collections. */
  public EvaluatedSetting {
    EnumMap<LimitedMeasure, Double> copy = new EnumMap<>(LimitedMeasure.class);
    copy.putAll(measures);
    measures = Collections.unmodifiableMap(copy);
    limits = List.copyOf(limits);
  }

  /** Returns whether every limit is met. */
  public boolean feasible() {
    return violation == 0;
  }
}
