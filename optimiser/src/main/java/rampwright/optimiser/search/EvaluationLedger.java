package rampwright.optimiser.search;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Future;
import rampwright.vehicle.input.InvalidInput;

/**
 * What a search has computed and what it may still compute. Laps of one batch are computed at the
 * same time; they are entered in the order of the batch, so that nothing depends on which thread
 * was first.
 */
final class EvaluationLedger {
  private final SearchProblem problem;
  private final ExecutorService executor;
  private final int budget;
  private final SearchMonitor monitor;
  private final Comparator<EvaluatedSetting> order;
  private final Map<Integer, Merit> merits = new HashMap<>();
  private final List<EvaluatedSetting> settings = new ArrayList<>();
  private final List<UnsolvedSetting> unsolved = new ArrayList<>();
  private final List<SearchProgress> history = new ArrayList<>();
  private EvaluatedSetting best;
  private RuntimeException failure;
  private int generation;
  private boolean cancelled;

  EvaluationLedger(
      SearchProblem problem, ExecutorService executor, int budget, SearchMonitor monitor) {
    this.problem = problem;
    this.executor = executor;
    this.budget = budget;
    this.monitor = monitor;
    this.order =
        Comparator.comparing(Merit::of)
            .thenComparingDouble(setting -> problem.changeTime(setting.setting()));
  }

  /** Returns whether the search may go on: not cancelled and budget left. */
  boolean open() {
    cancelled = cancelled || monitor.cancelled();
    return !cancelled && used() < budget;
  }

  boolean cancelled() {
    return cancelled;
  }

  /** Returns the number of laws that were computed. */
  int used() {
    return merits.size();
  }

  boolean knows(int index) {
    return merits.containsKey(problem.space().firstAlike(index));
  }

  /** Returns the merit of a setting, the worst when it is unknown. */
  Merit merit(int index) {
    return merits.getOrDefault(problem.space().firstAlike(index), Merit.WORST);
  }

  /** Returns the first setting of each law that is known, the best first. */
  List<Integer> ranked() {
    List<Integer> ranked = new ArrayList<>(merits.keySet());
    ranked.sort(
        Comparator.<Integer, Merit>comparing(merits::get).thenComparing(Comparator.naturalOrder()));
    return ranked;
  }

  /** Returns every setting that was evaluated, in the order of evaluation. */
  List<EvaluatedSetting> settings() {
    return List.copyOf(settings);
  }

  /** Returns the settings whose laps could not be computed. */
  List<UnsolvedSetting> unsolved() {
    return List.copyOf(unsolved);
  }

  /** Returns the progress after each generation. */
  List<SearchProgress> history() {
    return List.copyOf(history);
  }

  /**
   * Returns the best setting; of equally good ones the one that takes the shortest change.
   *
   * @throws InvalidInput when the car could not follow a circuit with any setting
   * @throws IllegalStateException when no lap could be solved
   */
  EvaluatedSetting best() {
    if (best == null) {
      throw failure;
    }
    return best;
  }

  /** Closes a generation: what follows counts as the next. */
  void closeGeneration() {
    if (best != null) {
      history.add(progress());
    }
    generation++;
  }

  /**
   * Computes one setting whatever the monitor says, so that even a search that is cancelled at once
   * has an answer.
   */
  void evaluateFirst(int index) {
    int law = problem.space().firstAlike(index);
    enter(law, computed(law));
  }

  /** Computes those settings of a batch whose laws are unknown, in order, as far as the budget. */
  void evaluate(Iterable<Integer> batch) {
    Set<Integer> wanted = new LinkedHashSet<>();
    for (int index : batch) {
      if (!knows(index) && used() + wanted.size() < budget) {
        wanted.add(problem.space().firstAlike(index));
      }
    }
    Map<Integer, Future<Outcome>> running = new HashMap<>();
    for (int law : wanted) {
      running.put(law, executor.submit(() -> outcome(law)));
    }
    for (int law : wanted) {
      enter(law, result(running.get(law)));
    }
  }

  /** What became of one law: its settings, or why it has none, or neither after a cancel. */
  private record Outcome(List<EvaluatedSetting> settings, RuntimeException failure) {
    static final Outcome CANCELLED = new Outcome(List.of(), null);
  }

  private Outcome outcome(int law) {
    return monitor.cancelled() ? Outcome.CANCELLED : computed(law);
  }

  private Outcome computed(int law) {
    try {
      return new Outcome(
          problem.space().alike(law).stream()
              .map(index -> problem.evaluate().apply(problem.space().setting(index)))
              .toList(),
          null);
    } catch (InvalidInput | IllegalStateException e) {
      // one lap that cannot be solved must not cost the answer of all others
      return new Outcome(List.of(), e);
    }
  }

  private void enter(int law, Outcome outcome) {
    if (outcome == Outcome.CANCELLED) {
      cancelled = true;
      return;
    }
    if (outcome.failure() != null) {
      failure = failure == null ? outcome.failure() : failure;
      merits.put(law, Merit.WORST);
      String reason = String.valueOf(outcome.failure().getMessage());
      unsolved.add(new UnsolvedSetting(problem.space().setting(law), reason));
      return;
    }
    for (EvaluatedSetting setting : outcome.settings()) {
      settings.add(setting);
      if (best == null || order.compare(setting, best) < 0) {
        best = setting;
      }
    }
    merits.put(law, outcome.settings().stream().map(Merit::of).min(Merit::compareTo).orElseThrow());
    monitor.progress(progress());
  }

  private SearchProgress progress() {
    return new SearchProgress(used(), budget, generation, best.lapTime(), best.feasible());
  }

  private Outcome result(Future<Outcome> future) {
    try {
      return future.get();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return Outcome.CANCELLED;
    } catch (ExecutionException e) {
      if (e.getCause() instanceof RuntimeException fault) {
        throw fault;
      }
      throw new IllegalStateException(e.getCause());
    }
  }
}
