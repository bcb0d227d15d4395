package rampwright.optimiser.search;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;

/**
 * The settings a search looks at before it follows anything: every stack (ring set as fitted and
 * faces) in turn, each time at a preload from another part of the range. A valley that only one
 * ring set has is then not left to chance.
 */
final class FirstSample {
  /** Parts of the preload range from which each stack has one setting. */
  private static final int PARTS = 2;

  /** Laws per batch; a cancel is heard between batches. */
  private static final int BATCH = 24;

  private final Candidates candidates;
  private final EvaluationLedger ledger;

  FirstSample(Candidates candidates, EvaluationLedger ledger) {
    this.candidates = candidates;
    this.ledger = ledger;
  }

  /** Computes so many laws at most, fewer where the stacks are few. */
  void run(long seed, int mostEvaluations) {
    List<Integer> order = order(new Random(seed));
    int most = Math.min(order.size(), mostEvaluations);
    for (int from = 0; from < most && ledger.open(); from += BATCH) {
      ledger.evaluate(order.subList(from, Math.min(most, from + BATCH)));
      ledger.closeGeneration();
    }
  }

  /** First one setting of every stack, then another of every stack. */
  private List<Integer> order(Random random) {
    List<List<Integer>> stacks = new ArrayList<>(candidates.byStack());
    Collections.shuffle(stacks, random);
    List<Integer> order = new ArrayList<>();
    for (int round = 0; round < PARTS; round++) {
      for (int stack = 0; stack < stacks.size(); stack++) {
        List<Integer> settings = stacks.get(stack);
        int part = (round + stack) % PARTS;
        int from = settings.size() * part / PARTS;
        int to = settings.size() * (part + 1) / PARTS;
        if (from < to) {
          order.add(settings.get(from + random.nextInt(to - from)));
        }
      }
    }
    return order;
  }
}
