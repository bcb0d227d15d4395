package rampwright.planted.optimiser.search;

import rampwright.planted.optimiser.event.EventThatKnowsTheSearch;

/** The other half of a circle between event and search. */
public final class SearchOfAnEvent {
  final EventThatKnowsTheSearch event;

  /**
   * Joins the search to its event.
   *
   * @param event the event that knows the search in turn
   */
  public SearchOfAnEvent(EventThatKnowsTheSearch event) {
    this.event = event;
  }
}
