package rampwright.web.search;

import jakarta.annotation.PreDestroy;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.springframework.beans.factory.ObjectProvider;
import org.springframework.boot.info.BuildProperties;
import org.springframework.stereotype.Service;
import rampwright.optimiser.search.SearchRequest;
import rampwright.web.store.RunState;
import rampwright.web.store.RunStore;

/**
 * Owns the searches: one runs at a time, the others wait their turn. A page may come and go; the
 * states and what leads from one to another stand at {@link RunState}. A job that has ended lives
 * on in the store only.
 */
@Service
class SearchJobs {
  private static final Logger LOG = LoggerFactory.getLogger(SearchJobs.class);
  private static final int SECONDS_TO_STOP = 5;

  private final RunStore runs;
  private final String version;
  private final Map<Long, SearchJob> live = new ConcurrentHashMap<>();
  private final ExecutorService runner =
      Executors.newSingleThreadExecutor(
          work -> {
            Thread thread = new Thread(work, "search");
            thread.setDaemon(true);
            return thread;
          });

  SearchJobs(RunStore runs, ObjectProvider<BuildProperties> build) {
    this.runs = runs;
    this.version =
        build.stream().findFirst().map(BuildProperties::getVersion).orElse("not packaged");
  }

  /**
   * Starts a search, or lets it wait for the one that runs.
   *
   * @param eventId place of the event in the store
   * @param request what to search
   * @return its place in the store
   */
  long start(Optional<Long> eventId, SearchRequest request) {
    SearchJob job = new SearchJob(runs.add(eventId, request, version), request, runs);
    live.put(job.id(), job);
    runner.execute(() -> run(job));
    return job.id();
  }

  /** Returns a job that has not ended. */
  Optional<SearchJob> find(long id) {
    return Optional.ofNullable(live.get(id));
  }

  /** Ends a job early; it keeps the best so far. */
  void cancel(long id) {
    find(id).ifPresent(job -> job.end(RunState.CANCELLED));
  }

  private void run(SearchJob job) {
    try {
      job.run();
    } catch (RuntimeException e) {
      LOG.error("Search {} failed", job.id(), e);
    } finally {
      live.remove(job.id());
    }
  }

  @PreDestroy
  void stop() throws InterruptedException {
    live.values().forEach(job -> job.end(RunState.INTERRUPTED));
    runner.shutdown();
    runner.awaitTermination(SECONDS_TO_STOP, TimeUnit.SECONDS);
  }
}
