package rampwright.optimiser.search;

import java.util.List;

/**
 * The answer of a search.
 *
 * @param method how it was found
 * @param seed start of the random numbers
 * @param evaluations laws whose laps were computed
 * @param best the best setting; when no setting that was computed meets all limits, the one that
 *     violates them least
 * @param feasible whether the best meets all limits
 * @param cancelled whether the search was ended early: the best is the best so far
 * @param alike settings that a stopwatch could not tell from the best, the best among them, grouped
 *     by ring set and faces, the cheapest change from the current setting first; empty when none
 *     meets all limits
 * @param unsolved settings whose laps could not be computed, one per law, in the order of the
 *     search
 * @param history the progress after each generation
 */
public record SearchResult(
    SearchMethod method,
    long seed,
    int evaluations,
    EvaluatedSetting best,
    boolean feasible,
    boolean cancelled,
    List<AlikeGroup> alike,
    List<UnsolvedSetting> unsolved,
    List<SearchProgress> history) {
  /** Copies the lists. */
  public SearchResult {
    alike = List.copyOf(alike);
    // results stored before laps could be left out do not name any
    unsolved = unsolved == null ? List.of() : List.copyOf(unsolved);
    history = List.copyOf(history);
  }

  /** Returns the setting that stands for each group, the cheapest change first. */
  public List<EvaluatedSetting> alternatives() {
    return alike.stream().map(AlikeGroup::setting).toList();
  }
}
