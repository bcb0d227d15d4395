package rampwright.optimiser.cli;

import java.io.PrintWriter;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.search.SearchMonitor;
import rampwright.optimiser.search.SearchProgress;
import rampwright.optimiser.search.SearchRequest;
import rampwright.optimiser.search.SearchResult;
import rampwright.optimiser.search.SettingEvaluator;
import rampwright.optimiser.search.SettingSearch;

/** {@code rampwright search}: the best setting that the kit builds. */
@Command(
    name = "search",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class,
    customSynopsis =
        "rampwright search EVENT.yaml [--seed N] [--threads N] [--evaluations N] [--json]",
    description = {
      "Searches the kit for the setting with the least lap time within the limits.",
      "Same event, seed and evaluations: same answer, on any number of threads. Exit code 3 when no"
          + " setting meets the limits."
    })
final class SearchCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;
  @Mixin private EventArgument event;
  @Mixin private OutputOption output;

  @Option(
      names = "--seed",
      paramLabel = "N",
      defaultValue = "1",
      description = "Start of the random numbers; ${DEFAULT-VALUE} where it is not given.")
  private long seed;

  @Option(
      names = "--threads",
      paramLabel = "N",
      description = "Laps that are computed at the same time; without: one per processor.")
  private Integer threads;

  @Option(
      names = "--evaluations",
      paramLabel = "N",
      defaultValue = "300",
      description = "Most settings whose laps are computed; ${DEFAULT-VALUE} if not given.")
  private int evaluations;

  @Override
  public Integer call() {
    int usedThreads = threads == null ? Runtime.getRuntime().availableProcessors() : threads;
    Event read = event.read();
    SearchRequest request = new SearchRequest(read, seed, usedThreads, evaluations);
    SettingEvaluator evaluator = SettingEvaluator.of(read);
    PrintWriter err = spec.commandLine().getErr();
    SearchMonitor monitor = output.json() ? SearchMonitor.NONE : new Generations(err);
    SearchResult result = SettingSearch.run(request, evaluator, monitor);
    SearchAnswer answer = SearchAnswer.of(request, evaluator, result);
    output.print(answer::text, answer::document);
    if (!result.feasible()) {
      err.println(answer.unmet());
      return Rampwright.NOTHING_MEETS_THE_LIMITS;
    }
    return 0;
  }

  /** Tells each new generation on standard error. */
  private static final class Generations implements SearchMonitor {
    private final PrintWriter err;
    private int told = -1;

    Generations(PrintWriter err) {
      this.err = err;
    }

    @Override
    public void progress(SearchProgress progress) {
      if (progress.generation() > told) {
        told = progress.generation();
        err.println(
            progress.evaluations()
                + " of at most "
                + progress.budget()
                + " evaluations, best "
                + Shown.number(progress.bestLapTime(), 3)
                + " s"
                + (progress.bestFeasible() ? "" : ", which breaks a limit"));
      }
    }

    @Override
    public boolean cancelled() {
      return false;
    }
  }
}
