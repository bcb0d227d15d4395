package rampwright.optimiser.search;

import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.stream.IntStream;
import rampwright.vehicle.input.InvalidInput;

/**
 * Searches a kit for the setting with the least lap time that meets all limits of the event.
 *
 * <p>Where the budget allows it every setting is computed. Else a sample of every ring set and
 * number of faces and a genetic search that starts from its best spend the first half of the
 * budget, and a local search around the best settings the rest. Settings that break a limit on the
 * parts themselves (preload, locking share) are left out from the start, unless all do.
 *
 * <p>The answer depends on event, seed and budget alone, not on the number of threads. Two equally
 * good settings are told apart by the time of the change from the current one. A setting whose lap
 * cannot be computed ranks last and is named in the answer.
 */
public final class SettingSearch {
  /** Share of the budget for the first sample. */
  private static final double SAMPLE_SHARE = 0.3;

  /** Share of the budget that is spent when the genetic part ends. */
  private static final double GENETIC_SHARE = 0.5;

  /** Laws per batch of an enumeration. */
  private static final int BATCH = 32;

  private SettingSearch() {}

  /**
   * Runs a search; returns when it has ended or the monitor has cancelled it.
   *
   * @throws InvalidInput when the event cannot be evaluated
   */
  public static SearchResult run(SearchRequest request, SearchMonitor monitor) {
    return run(request, SettingEvaluator.of(request.event()), monitor);
  }

  /**
   * Runs a search with an evaluator that may know laps already, for example those of an earlier
   * search in the same event. The answer is the same as without them, and is there sooner.
   *
   * @throws InvalidInput when the event cannot be evaluated
   */
  public static SearchResult run(
      SearchRequest request, SettingEvaluator evaluator, SearchMonitor monitor) {
    SearchProblem problem = SearchProblem.of(request.event(), evaluator);
    return run(problem, request.seed(), request.threads(), request.maxEvaluations(), monitor);
  }

  static SearchResult run(
      SearchProblem problem, long seed, int threads, int budget, SearchMonitor monitor) {
    Candidates candidates = Candidates.of(problem);
    int[] laws = candidates.laws();
    SearchMethod method = laws.length <= budget ? SearchMethod.ENUMERATED : SearchMethod.GENETIC;
    int limit = Math.min(budget, laws.length);
    ExecutorService executor = executor(threads);
    try {
      EvaluationLedger ledger = new EvaluationLedger(problem, executor, limit, monitor);
      ledger.evaluateFirst(first(problem, candidates));
      if (method == SearchMethod.ENUMERATED) {
        enumerate(laws, ledger);
      } else {
        new FirstSample(candidates, ledger).run(seed, (int) Math.ceil(limit * SAMPLE_SHARE));
        new GeneticSearch(problem, candidates, ledger)
            .run(seed, (int) Math.ceil(limit * GENETIC_SHARE));
        new NeighbourSearch(candidates, ledger).run();
      }
      return result(problem, ledger, method, seed);
    } finally {
      executor.shutdownNow();
    }
  }

  /** The current setting, or the nearest to it that may be proposed. */
  private static int first(SearchProblem problem, Candidates candidates) {
    return candidates.repaired(problem.current().map(problem.space()::index).orElse(0));
  }

  private static ExecutorService executor(int threads) {
    return Executors.newFixedThreadPool(
        threads,
        work -> {
          Thread thread = new Thread(work, "setting search");
          thread.setDaemon(true);
          return thread;
        });
  }

  private static void enumerate(int[] laws, EvaluationLedger ledger) {
    for (int from = 0; from < laws.length && ledger.open(); from += BATCH) {
      int to = Math.min(laws.length, from + BATCH);
      ledger.evaluate(IntStream.range(from, to).map(i -> laws[i]).boxed().toList());
      ledger.closeGeneration();
    }
  }

  private static SearchResult result(
      SearchProblem problem, EvaluationLedger ledger, SearchMethod method, long seed) {
    EvaluatedSetting best = ledger.best();
    return new SearchResult(
        method,
        seed,
        ledger.used(),
        best,
        best.feasible(),
        ledger.cancelled(),
        AlikeGroup.of(best, ledger.settings(), problem),
        ledger.unsolved(),
        ledger.history());
  }
}
