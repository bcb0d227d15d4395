package rampwright.web.search;

import java.util.List;
import rampwright.optimiser.search.SearchProgress;
import rampwright.web.store.RunState;

/**
 * How a job stands.
 *
 * @param state what it is doing
 * @param progress everything so far that is worth a point in a chart, the latest last
 * @param perSecond evaluations per second since it began; 0 before the first
 */
record JobNews(RunState state, List<SearchProgress> progress, double perSecond) {
  JobNews {
    progress = List.copyOf(progress);
  }
}
