package rampwright.optimiser.search;

/**
 * How far a search is.
 *
 * @param evaluations laws whose laps have been computed
 * @param budget most evaluations that the search will use
 * @param generation 0 for what is computed before the first generation; counts on through the local
 *     search at the end
 * @param bestLapTime lap time of the best setting so far (s)
 * @param bestFeasible whether that setting meets every limit
 */
public record SearchProgress(
    int evaluations, int budget, int generation, double bestLapTime, boolean bestFeasible) {}
