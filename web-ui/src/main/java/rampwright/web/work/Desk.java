package rampwright.web.work;

import jakarta.annotation.PreDestroy;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.function.Consumer;
import java.util.function.DoubleConsumer;
import org.springframework.stereotype.Service;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.vehicle.balance.LapAnalysis;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapRequest;
import rampwright.vehicle.lap.LapSolver;
import rampwright.vehicle.lap.LimitForm;

/**
 * Does the work that takes longer than a page may stand still. Equal requests have equal laps, so
 * the last laps are kept.
 */
@Service
public class Desk {
  /** A lap of 2000 stations is 0.8 MB. */
  private static final int LAPS_KEPT = 40;

  private final ExecutorService workers =
      Executors.newFixedThreadPool(
          Math.max(1, Runtime.getRuntime().availableProcessors() - 1), Desk::worker);

  private final Map<LapRequest, Lap> laps =
      Collections.synchronizedMap(
          new LinkedHashMap<>(16, 0.75f, true) {
            private static final long serialVersionUID = 1L;

            @Override
            protected boolean removeEldestEntry(Map.Entry<LapRequest, Lap> eldest) {
              return size() > LAPS_KEPT;
            }
          });

  /** Something to be computed. */
  @FunctionalInterface
  public interface Work<T> {
    /**
     * Computes it.
     *
     * @param progress takes the share that is done, 0 to 1
     */
    T compute(DoubleConsumer progress);
  }

  /**
   * Has something computed; exactly one of the two endings is called, on a thread of the desk.
   *
   * @param work what to compute
   * @param progress takes the share that is done
   * @param done takes the answer
   * @param failed takes what the work threw
   */
  public <T> void run(
      Work<T> work, DoubleConsumer progress, Consumer<T> done, Consumer<RuntimeException> failed) {
    workers.execute(
        () -> {
          T answer;
          try {
            answer = work.compute(progress);
          } catch (RuntimeException e) {
            failed.accept(e);
            return;
          } catch (Error e) {
            failed.accept(new IllegalStateException("The work ended with " + e, e));
            throw e;
          }
          done.accept(answer);
        });
  }

  /** Returns the lap of a request, from the kept ones if it is there. Takes time if it is not. */
  public Lap lap(LapRequest request) {
    Lap known = laps.get(request);
    if (known != null) {
      return known;
    }
    Lap solved = LapSolver.solve(request);
    laps.put(request, solved);
    return solved;
  }

  /** Returns the lap of a setting on a circuit of its event, with its report. Takes time. */
  public LapStudy study(Event event, NamedSetting setting, Circuit circuit, LimitForm form) {
    Lap lap = lap(event.lapRequest(setting, circuit, form));
    return new LapStudy(setting, lap, LapAnalysis.report(lap));
  }

  @PreDestroy
  void stop() {
    workers.shutdownNow();
  }

  private static Thread worker(Runnable work) {
    Thread thread = new Thread(work, "desk");
    thread.setDaemon(true);
    return thread;
  }
}
