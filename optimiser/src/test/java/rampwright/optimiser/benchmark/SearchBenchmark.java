package rampwright.optimiser.benchmark;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.EventFile;
import rampwright.optimiser.search.SearchMonitor;
import rampwright.optimiser.search.SearchRequest;
import rampwright.optimiser.search.SearchResult;
import rampwright.optimiser.search.SettingSearch;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.file.FileSource;

/** A search in the main sample event on one and on two threads. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.SECONDS)
@Warmup(iterations = 1)
@Measurement(iterations = 3)
@Fork(1)
public class SearchBenchmark {
  private static final int EVALUATIONS = 60;

  @Param({"1", "2"})
  int threads;

  private final Event event =
      EventFile.read(
          FileSource.classPath(SearchBenchmark.class.getClassLoader(), SampleFiles.BASE),
          SampleFiles.MAIN_EVENT);

  /** Runs a search of sixty evaluations. */
  @Benchmark
  public SearchResult search() {
    return SettingSearch.run(new SearchRequest(event, 1, threads, EVALUATIONS), SearchMonitor.NONE);
  }
}
