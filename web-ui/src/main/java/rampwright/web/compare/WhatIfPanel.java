package rampwright.web.compare;

import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.NativeDetails;
import com.vaadin.flow.component.html.Span;
import java.util.Optional;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.vehicle.input.InvalidInput;
import rampwright.web.store.EventChange;
import rampwright.web.store.EventStore;
import rampwright.web.widget.KitSettingFields;
import rampwright.web.widget.Notice;
import rampwright.web.widget.SettingWords;

/** A setting by hand, compared at once with the others and kept only if a person says so. */
final class WhatIfPanel extends NativeDetails {
  private static final long serialVersionUID = 1L;
  private static final String NAME = "what if";

  private final transient EventStore events;
  private final KitSettingFields fields;
  private final transient Runnable changed;
  private final Div answer = new Div();
  private transient NamedSetting tried;

  WhatIfPanel(Event event, EventStore events, Runnable changed) {
    this.events = events;
    this.changed = changed;
    addClassName("rw-what-if");
    setSummaryText("What if: try another setting by hand");
    fields = new KitSettingFields(event);
    event.current().kitSetting().ifPresent(fields::show);
    Div buttons =
        new Div(
            new Button("Try it", click -> take(true)),
            new Button("Take it out", click -> take(false)),
            new Button("Add to settings", click -> keep()));
    buttons.addClassName("rw-row");
    setContent(new Div(fields, buttons, answer));
  }

  /** Returns the setting that is tried, empty when there is none. */
  Optional<NamedSetting> setting() {
    return Optional.ofNullable(tried);
  }

  private void take(boolean wanted) {
    answer.removeAll();
    try {
      tried = wanted ? fields.read(NAME) : null;
      changed.run();
    } catch (InvalidInput e) {
      answer.add(Notice.error(e.getMessage()));
    }
  }

  private void keep() {
    answer.removeAll();
    try {
      NamedSetting setting = fields.read(NAME);
      String name = SettingWords.whole(setting.kitSetting().orElseThrow());
      events.change(
          event ->
              EventChange.setting(event, event.built(name, setting.kitSetting().orElseThrow())));
      Span saved = new Span("Kept in the event as " + name);
      saved.addClassName("rw-saved");
      answer.add(saved);
    } catch (InvalidInput e) {
      answer.add(Notice.error(e.getMessage()));
    }
  }
}
