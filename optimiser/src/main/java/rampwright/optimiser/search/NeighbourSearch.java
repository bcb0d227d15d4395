package rampwright.optimiser.search;

import java.util.LinkedHashSet;
import java.util.Set;

/**
 * The local search after the genetic one: computes unknown neighbours of the best settings, those
 * of the best first. When the best moves, so does the search; when all its neighbours are known the
 * next best have their turn.
 */
final class NeighbourSearch {
  /** Laws per batch; fixed, so that the answer does not depend on the number of threads. */
  private static final int BATCH = 8;

  private final Candidates candidates;
  private final EvaluationLedger ledger;

  NeighbourSearch(Candidates candidates, EvaluationLedger ledger) {
    this.candidates = candidates;
    this.ledger = ledger;
  }

  /** Runs until the budget is spent, no neighbour is unknown, or the monitor cancels. */
  void run() {
    while (ledger.open()) {
      Set<Integer> batch = unknownNeighbours();
      if (batch.isEmpty()) {
        return;
      }
      ledger.evaluate(batch);
      ledger.closeGeneration();
    }
  }

  private Set<Integer> unknownNeighbours() {
    Set<Integer> batch = new LinkedHashSet<>();
    for (int centre : ledger.ranked()) {
      for (int neighbour : candidates.neighbours(centre)) {
        if (!ledger.knows(neighbour)) {
          batch.add(neighbour);
        }
        if (batch.size() == BATCH) {
          return batch;
        }
      }
    }
    return batch;
  }
}
