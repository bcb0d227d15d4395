package rampwright.web.store;

import java.time.OffsetDateTime;

/**
 * A search run in a list.
 *
 * @param id place in the store
 * @param eventName name of its event
 * @param seed start of its random numbers
 * @param budget most evaluations
 * @param state what it is doing
 * @param started when it was asked for
 * @param version program that ran it
 */
public record RunSummary(
    long id,
    String eventName,
    long seed,
    int budget,
    RunState state,
    OffsetDateTime started,
    String version) {}
