package rampwright.optimiser.search;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.OptionalInt;
import java.util.Set;

/**
 * The local search after the genetic one. It works at several valleys at once, because the best one
 * known is not always the deepest. A valley is a setting that is better than the next known ones of
 * its stack (ring set as fitted and faces) at lower and higher preload. Its preload is searched by
 * halving the gaps to these, so by large steps first; the stacks of similar locking shares follow.
 *
 * <p>Where limits are active the best setting lies beside faster ones that break them: some of each
 * batch goes to such settings, those that break them least first.
 */
final class NeighbourSearch {
  /** Laws per batch; fixed, so that the answer does not depend on the number of threads. */
  private static final int BATCH = 8;

  /** Laws per batch beside settings that are faster than the best but break a limit. */
  private static final int BESIDE_FASTER = 2;

  /** Laws per batch that are one each of the best valleys; the rest are of the best alone. */
  private static final int ONE_EACH = 4;

  private final Candidates candidates;
  private final EvaluationLedger ledger;

  NeighbourSearch(Candidates candidates, EvaluationLedger ledger) {
    this.candidates = candidates;
    this.ledger = ledger;
  }

  /** Runs until the budget is spent, no neighbour is unknown, or the monitor cancels. */
  void run() {
    while (ledger.open()) {
      Set<Integer> batch = batch();
      if (batch.isEmpty()) {
        return;
      }
      ledger.evaluate(batch);
      ledger.closeGeneration();
    }
  }

  private Set<Integer> batch() {
    Set<Integer> batch = new LinkedHashSet<>();
    List<Integer> valleys = valleys();
    addOneEach(fasterThanTheBest(valleys), BESIDE_FASTER, batch);
    addOneEach(valleys, BESIDE_FASTER + ONE_EACH, batch);
    addAll(valleys, batch);
    addAll(ledger.ranked(), batch);
    return batch;
  }

  private void addOneEach(List<Integer> centres, int size, Set<Integer> batch) {
    for (int centre : centres) {
      if (batch.size() >= size) {
        return;
      }
      unknown(centre).stream().filter(i -> !batch.contains(i)).findFirst().ifPresent(batch::add);
    }
  }

  private void addAll(List<Integer> centres, Set<Integer> batch) {
    for (int centre : centres) {
      for (int neighbour : unknown(centre)) {
        if (batch.size() == BATCH) {
          return;
        }
        batch.add(neighbour);
      }
    }
  }

  /** Returns the best known of each valley, the best first. */
  private List<Integer> valleys() {
    return ledger.ranked().stream()
        .filter(i -> !better(nextKnown(i, 1), i) && !better(nextKnown(i, -1), i))
        .toList();
  }

  private boolean better(OptionalInt other, int index) {
    return other.isPresent() && ledger.merit(other.getAsInt()).compareTo(ledger.merit(index)) < 0;
  }

  private List<Integer> fasterThanTheBest(List<Integer> valleys) {
    Merit best = ledger.merit(valleys.get(0));
    return valleys.stream()
        .filter(i -> ledger.merit(i).violation() > best.violation())
        .filter(i -> ledger.merit(i).objective() < best.objective())
        .toList();
  }

  private OptionalInt nextKnown(int index, int direction) {
    return candidates.line(index, direction).filter(ledger::knows).findFirst();
  }

  /** Returns the unknown neighbours of a setting: along its preload, then of similar stacks. */
  private List<Integer> unknown(int centre) {
    List<Integer> unknown = new ArrayList<>();
    for (int direction : List.of(1, -1)) {
      int[] gap = candidates.line(centre, direction).takeWhile(i -> !ledger.knows(i)).toArray();
      if (gap.length > 0) {
        // where nothing is known further on, the end of the range is asked first
        boolean closed = nextKnown(centre, direction).isPresent();
        unknown.add(gap[closed ? gap.length / 2 : gap.length - 1]);
      }
    }
    candidates.similar(centre).stream().filter(i -> !ledger.knows(i)).forEach(unknown::add);
    return unknown;
  }
}
