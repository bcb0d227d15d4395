package rampwright.planted.optimiser.event;

import rampwright.planted.optimiser.search.SearchOfAnEvent;

/** Closes a circle between event and search on purpose. */
public final class EventThatKnowsTheSearch {
  SearchOfAnEvent search() {
    return new SearchOfAnEvent(this);
  }
}
