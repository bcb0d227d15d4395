package rampwright.web.event;

import java.util.function.UnaryOperator;
import rampwright.optimiser.event.Event;
import rampwright.vehicle.input.InvalidInput;

/** Changes the open event. */
@FunctionalInterface
interface EventEditor {
  /**
   * Changes and stores it.
   *
   * @throws InvalidInput when the change breaks a rule; nothing is stored then
   */
  void change(UnaryOperator<Event> change);
}
