package rampwright.optimiser.search;

import rampwright.optimiser.event.Event;
import rampwright.vehicle.input.Quantity;

/**
 * What a search depends on. Equal event, seed and budget have equal answers on any number of
 * threads.
 *
 * @param event the event
 * @param seed start of the random numbers
 * @param threads laps that are computed at the same time
 * @param maxEvaluations the budget: most laws whose laps are computed; builds that drive exactly
 *     alike share a law
 */
public record SearchRequest(Event event, long seed, int threads, int maxEvaluations) {
  public static final Quantity THREADS =
      Quantity.si("threads", "number of threads", "", 1, 256, "");
  public static final Quantity MAX_EVALUATIONS =
      Quantity.si("max_evaluations", "number of evaluations", "", 1, 1e6, "");

  /** Checks the numbers. */
  public SearchRequest {
    THREADS.check(threads);
    MAX_EVALUATIONS.check(maxEvaluations);
  }
}
