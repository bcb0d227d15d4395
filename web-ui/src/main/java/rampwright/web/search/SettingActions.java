package rampwright.web.search;

import com.vaadin.flow.component.UI;
import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.notification.Notification;
import com.vaadin.flow.router.QueryParameters;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.kit.KitSetting;
import rampwright.vehicle.input.InvalidInput;
import rampwright.web.store.EventChange;
import rampwright.web.store.EventStore;
import rampwright.web.store.StoredRun;
import rampwright.web.widget.SettingWords;

/** What can be done with a setting that a search has found. */
final class SettingActions extends Div {
  private static final long serialVersionUID = 1L;

  SettingActions(StoredRun run, KitSetting setting, EventStore events) {
    addClassName("rw-row");
    add(
        new Button("Compare with today's", click -> compare(run, setting, events)),
        new Button("Add to settings", click -> add(run, setting, events)),
        new Button("Make its sheet", click -> sheet(run, setting, events)));
  }

  private static void compare(StoredRun run, KitSetting setting, EventStore events) {
    if (events.open().event().current().kitSetting().equals(Optional.of(setting))) {
      tell("This is the setting that is in the car: there is nothing to compare.");
      return;
    }
    add(run, setting, events)
        .ifPresent(
            name ->
                UI.getCurrent()
                    .navigate(
                        "compare",
                        new QueryParameters(
                            Map.of(
                                "setting",
                                List.of(events.open().event().currentSetting(), name)))));
  }

  private static void sheet(StoredRun run, KitSetting setting, EventStore events) {
    add(run, setting, events)
        .ifPresent(name -> UI.getCurrent().navigate("sheet", QueryParameters.of("setting", name)));
  }

  /**
   * Adds a setting to the open event unless it has one with the same parts, and returns its name;
   * empty when the search was in another event.
   */
  static Optional<String> add(StoredRun run, KitSetting setting, EventStore events) {
    Event event = events.open().event();
    if (!run.eventId().equals(Optional.of(events.open().id()))) {
      tell(
          "This search was in another event. Open "
              + run.request().event().name()
              + " on the Event page first.");
      return Optional.empty();
    }
    Optional<String> known =
        event.settings().stream()
            .filter(other -> other.kitSetting().equals(Optional.of(setting)))
            .map(NamedSetting::name)
            .findFirst();
    if (known.isPresent()) {
      tell("The event has it already, as " + known.get() + ".");
      return known;
    }
    String name = "search " + run.id() + ": " + SettingWords.whole(setting);
    try {
      events.change(open -> EventChange.setting(open, open.built(name, setting)));
    } catch (InvalidInput e) {
      tell(e.getMessage());
      return Optional.empty();
    }
    tell("Added to the event as " + name + ".");
    return Optional.of(name);
  }

  private static void tell(String text) {
    Notification.show(text, 5000, Notification.Position.BOTTOM_START);
  }
}
