package rampwright.web.store;

import rampwright.optimiser.event.Event;

/**
 * An event with its place in the store.
 *
 * @param id place in the store
 * @param event the event
 */
public record StoredEvent(long id, Event event) {}
