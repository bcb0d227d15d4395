package rampwright.web.search;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.function.Consumer;
import rampwright.optimiser.search.SearchMonitor;
import rampwright.optimiser.search.SearchProgress;
import rampwright.optimiser.search.SearchRequest;
import rampwright.optimiser.search.SearchResult;
import rampwright.optimiser.search.SettingSearch;
import rampwright.vehicle.input.InvalidInput;
import rampwright.web.store.RunState;
import rampwright.web.store.RunStore;

/** One search from its start to its end, with a checkpoint in the store every few seconds. */
final class SearchJob implements SearchMonitor {
  private static final long NEWS_NANOS = 300_000_000L;
  private static final long CHECKPOINT_NANOS = 3_000_000_000L;

  private final long id;
  private final SearchRequest request;
  private final RunStore runs;
  private final List<Consumer<JobNews>> watchers = new CopyOnWriteArrayList<>();
  private final List<SearchProgress> kept = new ArrayList<>();
  private volatile RunState state = RunState.WAITING;

  /** How it is to end early; the first wish counts. */
  private volatile RunState wish;

  private long begun;
  private long lastNews;
  private long lastCheckpoint;
  private SearchProgress latest;

  SearchJob(long id, SearchRequest request, RunStore runs) {
    this.id = id;
    this.request = request;
    this.runs = runs;
  }

  long id() {
    return id;
  }

  /** Tells a watcher how the job stands, now and from now on. */
  synchronized void watch(Consumer<JobNews> watcher) {
    watchers.add(watcher);
    watcher.accept(news());
  }

  void leave(Consumer<JobNews> watcher) {
    watchers.remove(watcher);
  }

  /** Ends it early as cancelled or interrupted. */
  void end(RunState how) {
    if (wish == null) {
      wish = how;
    }
  }

  /** Runs it; returns when it has ended and is stored. */
  void run() {
    if (wish != null) {
      finish(wish, Optional.empty(), "");
      return;
    }
    synchronized (this) {
      state = RunState.RUNNING;
      begun = System.nanoTime();
      lastCheckpoint = begun;
    }
    runs.begin(id);
    tell();
    try {
      SearchResult result = SettingSearch.run(request, this);
      finish(result.cancelled() && wish != null ? wish : RunState.DONE, Optional.of(result), "");
    } catch (InvalidInput e) {
      finish(RunState.FAILED, Optional.empty(), e.getMessage());
    } catch (RuntimeException | Error e) {
      finish(RunState.FAILED, Optional.empty(), "A fault of the program stopped it: " + e);
      throw e;
    }
  }

  @Override
  public void progress(SearchProgress progress) {
    long now = System.nanoTime();
    boolean due;
    synchronized (this) {
      keep(progress);
      due = now - lastNews > NEWS_NANOS;
      if (due) {
        lastNews = now;
      }
    }
    if (due) {
      tell();
    }
    if (now - lastCheckpoint > CHECKPOINT_NANOS) {
      lastCheckpoint = now;
      runs.checkpoint(id, news().progress());
    }
  }

  @Override
  public boolean cancelled() {
    return wish != null;
  }

  /** A point for every better setting is enough for the chart, and the latest for the numbers. */
  private void keep(SearchProgress progress) {
    SearchProgress before = kept.isEmpty() ? null : kept.get(kept.size() - 1);
    boolean better =
        before == null
            || before.bestLapTime() != progress.bestLapTime()
            || before.bestFeasible() != progress.bestFeasible();
    if (better) {
      kept.add(progress);
    }
    latest = progress;
  }

  private void finish(RunState end, Optional<SearchResult> result, String message) {
    List<SearchProgress> progress = news().progress();
    runs.end(id, end, progress, result, message);
    state = end;
    tell();
  }

  private void tell() {
    JobNews news = news();
    watchers.forEach(watcher -> watcher.accept(news));
  }

  private synchronized JobNews news() {
    List<SearchProgress> progress = new ArrayList<>(kept);
    if (latest != null && !latest.equals(progress.get(progress.size() - 1))) {
      progress.add(latest);
    }
    double seconds = (System.nanoTime() - begun) / 1e9;
    double rate = latest == null || begun == 0 ? 0 : latest.evaluations() / seconds;
    return new JobNews(state, progress, rate);
  }
}
