package rampwright.web.store;

import java.time.OffsetDateTime;
import java.util.List;
import java.util.Optional;
import rampwright.optimiser.search.SearchProgress;
import rampwright.optimiser.search.SearchRequest;
import rampwright.optimiser.search.SearchResult;

/**
 * A search run with everything that it takes to show or repeat it.
 *
 * @param id place in the store
 * @param eventId place of its event in the store; empty when that is gone
 * @param request what was searched, the event as it was then included
 * @param version program that ran it
 * @param state what it is doing
 * @param started when it was asked for
 * @param progress how it went, up to the last checkpoint
 * @param result its answer, where it has one
 * @param message why it failed, else empty
 */
public record StoredRun(
    long id,
    Optional<Long> eventId,
    SearchRequest request,
    String version,
    RunState state,
    OffsetDateTime started,
    List<SearchProgress> progress,
    Optional<SearchResult> result,
    String message) {
  /** Copies the list. */
  public StoredRun {
    progress = List.copyOf(progress);
  }
}
