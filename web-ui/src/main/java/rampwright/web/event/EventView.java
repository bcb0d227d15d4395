package rampwright.web.event;

import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.combobox.ComboBox;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H1;
import com.vaadin.flow.router.Menu;
import com.vaadin.flow.router.PageTitle;
import com.vaadin.flow.router.Route;
import java.util.List;
import java.util.function.UnaryOperator;
import rampwright.optimiser.event.Event;
import rampwright.web.store.EventName;
import rampwright.web.store.EventStore;
import rampwright.web.store.StoredEvent;

/** The first page of the job: what is raced, where and with which parts. */
@Route("")
@PageTitle("Event · Rampwright")
@Menu(title = "Event", order = 1)
class EventView extends Div {
  private static final long serialVersionUID = 1L;

  private final transient EventStore events;
  private final Div parts = new Div();

  EventView(EventStore events) {
    this.events = events;
    addClassName("rw-view");
    parts.addClassName("rw-sections");
    Div head = new Div(new H1("Event"), chooser());
    head.addClassName("rw-head");
    add(head, parts);
    refresh();
  }

  private Div chooser() {
    ComboBox<EventName> choice = new ComboBox<>("Open event");
    choice.addClassName("rw-choice-wide");
    choice.setItemLabelGenerator(EventName::name);
    List<EventName> known = events.list();
    choice.setItems(known);
    long open = events.open().id();
    known.stream().filter(name -> name.id() == open).findFirst().ifPresent(choice::setValue);
    choice.setAllowCustomValue(false);
    choice.addValueChangeListener(
        change -> {
          if (change.isFromClient() && change.getValue() != null) {
            events.open(change.getValue().id());
            reload();
          }
        });
    Button restore =
        new Button(
            "Back to the sample",
            click -> {
              events.restoreSample();
              reload();
            });
    restore.setTooltipText("Takes every change to this event back");
    Div chooser = new Div(choice, restore);
    chooser.addClassName("rw-row");
    return chooser;
  }

  /** The name in the frame changes with the event, so the whole page is asked for again. */
  private void reload() {
    getUI().ifPresent(ui -> ui.navigate(EventView.class));
    refresh();
  }

  private void change(UnaryOperator<Event> change) {
    events.change(change);
    refresh();
  }

  private void refresh() {
    StoredEvent stored = events.open();
    Event event = stored.event();
    parts.removeAll();
    parts.add(
        new SettingsPanel(event, this::change),
        new CircuitsPanel(event, this::change),
        new LimitsPanel(event, events::change),
        new DriverPanel(event, events::change),
        new ConditionsPanel(event, events::change),
        new CarPanel(event.car(), event.conditions()),
        new KitPanel(event.kit()));
  }
}
