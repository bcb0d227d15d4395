package rampwright.web.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import rampwright.optimiser.search.SearchMonitor;
import rampwright.optimiser.search.SearchProgress;
import rampwright.optimiser.search.SearchRequest;
import rampwright.optimiser.search.SearchResult;
import rampwright.optimiser.search.SettingSearch;

class RunStoreTest {
  private static final SearchRequest REQUEST = new SearchRequest(SmallEvent.event(), 7, 1, 6);

  @Test
  void aRunComesBackWithInputsAndAnswerAfterAStart() {
    TestStores stores = TestStores.inMemory("answer");
    RunStore runs = stores.runs();
    long id = runs.add(Optional.empty(), REQUEST, "1.2.3");
    runs.begin(id);
    SearchResult result = SettingSearch.run(REQUEST, SearchMonitor.NONE);
    runs.end(id, RunState.DONE, result.history(), Optional.of(result), "");

    StoredRun run = stores.runs().find(id).orElseThrow();
    assertThat(run.request()).isEqualTo(REQUEST);
    assertThat(run.result()).contains(result);
    assertThat(run.progress()).isEqualTo(result.history());
    assertThat(run.version()).isEqualTo("1.2.3");
    assertThat(run.state()).isEqualTo(RunState.DONE);
    assertThat(SettingSearch.run(run.request(), SearchMonitor.NONE)).isEqualTo(result);
  }

  @Test
  void whatRanWhenTheProgramEndedIsInterruptedAndKeepsItsLastCheckpoint() {
    TestStores stores = TestStores.inMemory("kill");
    RunStore runs = stores.runs();
    long running = runs.add(Optional.empty(), REQUEST, "1");
    long waiting = runs.add(Optional.empty(), REQUEST, "1");
    List<SearchProgress> progress = List.of(new SearchProgress(3, 6, 0, 20.5, true));
    runs.begin(running);
    runs.checkpoint(running, progress);

    RunStore after = stores.runs();
    assertThat(after.list()).extracting(RunSummary::id).containsExactly(waiting, running);
    assertThat(after.list()).extracting(RunSummary::state).containsOnly(RunState.INTERRUPTED);
    assertThat(after.find(running).orElseThrow().progress()).isEqualTo(progress);
    assertThat(after.find(running).orElseThrow().request()).isEqualTo(REQUEST);
  }

  @Test
  void aNumberThatIsNotThereHasNoRun() {
    assertThat(TestStores.inMemory("none").runs().find(99)).isEmpty();
  }
}
