package rampwright.web.search;

import com.vaadin.flow.component.AttachEvent;
import com.vaadin.flow.component.DetachEvent;
import com.vaadin.flow.component.UI;
import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.Span;
import com.vaadin.flow.component.progressbar.ProgressBar;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.LongConsumer;
import rampwright.optimiser.search.SearchProgress;
import rampwright.web.store.EventStore;
import rampwright.web.store.RunState;
import rampwright.web.store.StoredRun;
import rampwright.web.widget.Notice;
import rampwright.web.widget.Section;
import rampwright.web.widget.Shown;

/** One search: how far it is while it runs, its answer when it has ended. */
final class RunPanel extends Section {
  private static final long serialVersionUID = 1L;

  private final transient StoredRun run;
  private final transient SearchJobs jobs;
  private final transient LongConsumer open;
  private final ProgressBar bar = new ProgressBar(0, 1);
  private final Span numbers = new Span();
  private final ConvergenceChart chart;
  private transient Consumer<JobNews> watcher;

  RunPanel(
      StoredRun run,
      SearchJobs jobs,
      EventStore events,
      LongConsumer open,
      Consumer<StoredRun> repeat) {
    super("Search " + run.id() + " in " + run.request().event().name());
    this.run = run;
    this.jobs = jobs;
    this.open = open;
    this.chart = new ConvergenceChart(run.progress());
    Span state = new Span(words(run));
    state.addClassName("rw-run-state");
    add(state);
    if (run.state().ended()) {
      add(ended(repeat));
    } else {
      numbers.setText("waiting for the search before it to end");
      Div running = new Div(numbers, bar, new Button("Cancel", click -> jobs.cancel(run.id())));
      running.addClassName("rw-waiting");
      add(running);
    }
    add(chart);
    run.result().ifPresent(result -> add(new ResultPanel(run, result, events)));
  }

  private static String words(StoredRun run) {
    return run.state().label()
        + " · seed "
        + run.request().seed()
        + " · at most "
        + run.request().maxEvaluations()
        + " evaluations · "
        + run.request().threads()
        + " at a time · version "
        + run.version();
  }

  private Div ended(Consumer<StoredRun> repeat) {
    Div ended = new Div();
    if (run.state() == RunState.INTERRUPTED) {
      ended.add(
          Notice.error(
              "The program ended while this search ran. Run it again: the same inputs and seed give"
                  + " the same answer."));
    }
    if (!run.message().isEmpty()) {
      ended.add(Notice.error(run.message()));
    }
    ended.add(new Button("Run it again", click -> repeat.accept(run)));
    return ended;
  }

  @Override
  protected void onAttach(AttachEvent attach) {
    UI ui = attach.getUI();
    if (run.state().ended()) {
      return;
    }
    watcher = news -> ui.accessLater(() -> show(news), () -> {}).run();
    Optional<SearchJob> job = jobs.find(run.id());
    // it may have ended since the page asked the store
    job.ifPresentOrElse(found -> found.watch(watcher), () -> open.accept(run.id()));
  }

  @Override
  protected void onDetach(DetachEvent detach) {
    if (watcher != null) {
      jobs.find(run.id()).ifPresent(job -> job.leave(watcher));
    }
  }

  private void show(JobNews news) {
    if (!isAttached()) {
      return;
    }
    if (news.state().ended()) {
      open.accept(run.id());
      return;
    }
    List<SearchProgress> progress = news.progress();
    if (progress.isEmpty()) {
      bar.setIndeterminate(true);
      numbers.setText(
          news.state() == RunState.WAITING
              ? "waiting for the search before it to end"
              : "computing the first laps");
      return;
    }
    SearchProgress latest = progress.get(progress.size() - 1);
    bar.setIndeterminate(false);
    bar.setValue(Math.min(1, (double) latest.evaluations() / latest.budget()));
    numbers.setText(numbers(latest, news.perSecond()));
    chart.show(progress);
  }

  private static String numbers(SearchProgress latest, double perSecond) {
    double left = (latest.budget() - latest.evaluations()) / perSecond;
    return latest.evaluations()
        + " of at most "
        + latest.budget()
        + " evaluations · "
        + Shown.of(perSecond, 1, "per second")
        + " · about "
        + (left > 120 ? Shown.of(left / 60, 0, "min") : Shown.of(Math.ceil(left), 0, "s"))
        + " left · best "
        + Shown.of(latest.bestLapTime(), 3, "s")
        + (latest.bestFeasible() ? ", all limits met" : ", not all limits met yet");
  }
}
