package rampwright.web.search;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.CountDownLatch;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.support.DefaultListableBeanFactory;
import org.springframework.boot.info.BuildProperties;
import rampwright.optimiser.search.SearchMonitor;
import rampwright.optimiser.search.SearchRequest;
import rampwright.optimiser.search.SettingSearch;
import rampwright.web.store.RunState;
import rampwright.web.store.RunStore;
import rampwright.web.store.SmallEvent;
import rampwright.web.store.StoredRun;
import rampwright.web.store.TestStores;

class SearchJobsTest {
  private static final SearchRequest SHORT = new SearchRequest(SmallEvent.event(), 3, 1, 8);
  private static final SearchRequest LONG = new SearchRequest(SmallEvent.event(), 3, 1, 100_000);

  private static SearchJobs jobs(RunStore runs) {
    return new SearchJobs(
        runs, new DefaultListableBeanFactory().getBeanProvider(BuildProperties.class));
  }

  /** Waits until a job has ended; the latch of a test that hangs is the build's own timeout. */
  private static List<JobNews> ended(SearchJobs jobs, long id) throws InterruptedException {
    List<JobNews> news = new CopyOnWriteArrayList<>();
    CountDownLatch end = new CountDownLatch(1);
    jobs.find(id)
        .ifPresentOrElse(
            job ->
                job.watch(
                    latest -> {
                      news.add(latest);
                      if (latest.state().ended()) {
                        end.countDown();
                      }
                    }),
            end::countDown);
    end.await();
    return news;
  }

  @Test
  void aJobEndsWithTheAnswerOfTheSearchItself() throws InterruptedException {
    RunStore runs = TestStores.inMemory("jobs-answer").runs();
    SearchJobs jobs = jobs(runs);
    long id = jobs.start(Optional.empty(), SHORT);
    ended(jobs, id);
    StoredRun run = runs.find(id).orElseThrow();
    assertThat(run.state()).isEqualTo(RunState.DONE);
    assertThat(run.result()).contains(SettingSearch.run(SHORT, SearchMonitor.NONE));
    assertThat(run.progress()).isNotEmpty();
    assertThat(run.progress().get(run.progress().size() - 1).evaluations())
        .isEqualTo(run.result().orElseThrow().evaluations());
    jobs.stop();
  }

  @Test
  void theNextJobWaitsAndACancelledOneKeepsItsBest() throws InterruptedException {
    RunStore runs = TestStores.inMemory("jobs-cancel").runs();
    SearchJobs jobs = jobs(runs);
    long first = jobs.start(Optional.empty(), LONG);
    long second = jobs.start(Optional.empty(), SHORT);
    CountDownLatch begun = new CountDownLatch(1);
    jobs.find(first)
        .orElseThrow()
        .watch(
            news -> {
              if (!news.progress().isEmpty()) {
                begun.countDown();
              }
            });
    begun.await();
    assertThat(runs.find(second).orElseThrow().state()).isEqualTo(RunState.WAITING);

    jobs.cancel(first);
    ended(jobs, first);
    StoredRun cancelled = runs.find(first).orElseThrow();
    assertThat(cancelled.state()).isEqualTo(RunState.CANCELLED);
    assertThat(cancelled.result().orElseThrow().cancelled()).isTrue();
    ended(jobs, second);
    assertThat(runs.find(second).orElseThrow().state()).isEqualTo(RunState.DONE);
    jobs.stop();
  }

  @Test
  void theEndOfTheProgramInterruptsWhatRunsAndWhatWaits() throws InterruptedException {
    RunStore runs = TestStores.inMemory("jobs-stop").runs();
    SearchJobs jobs = jobs(runs);
    long first = jobs.start(Optional.empty(), LONG);
    long second = jobs.start(Optional.empty(), LONG);
    jobs.stop();
    assertThat(runs.find(first).orElseThrow().state()).isEqualTo(RunState.INTERRUPTED);
    assertThat(runs.find(second).orElseThrow().state()).isEqualTo(RunState.INTERRUPTED);
  }

  @Test
  void aWatcherThatComesLateIsToldHowTheJobStandsAndOneThatLeftHearsNoMore()
      throws InterruptedException {
    RunStore runs = TestStores.inMemory("jobs-watch").runs();
    SearchJobs jobs = jobs(runs);
    long id = jobs.start(Optional.empty(), LONG);
    SearchJob job = jobs.find(id).orElseThrow();
    List<JobNews> left = new CopyOnWriteArrayList<>();
    Consumer<JobNews> watcher = left::add;
    job.watch(watcher);
    job.leave(watcher);
    assertThat(left).hasSize(1);
    jobs.cancel(id);
    ended(jobs, id);
    assertThat(left).hasSize(1);
    jobs.stop();
  }
}
