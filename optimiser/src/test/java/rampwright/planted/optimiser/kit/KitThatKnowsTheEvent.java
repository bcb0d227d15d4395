package rampwright.planted.optimiser.kit;

import rampwright.planted.optimiser.event.EventThatKnowsTheSearch;

/** Lets the drawer know the event on purpose. */
public final class KitThatKnowsTheEvent {
  EventThatKnowsTheSearch event() {
    return new EventThatKnowsTheSearch();
  }
}
