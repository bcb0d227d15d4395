package rampwright.web.lap;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H1;
import com.vaadin.flow.component.select.Select;
import com.vaadin.flow.router.Menu;
import com.vaadin.flow.router.PageTitle;
import com.vaadin.flow.router.Route;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.lap.LimitForm;
import rampwright.web.store.EventStore;
import rampwright.web.widget.Assumptions;
import rampwright.web.widget.Choice;
import rampwright.web.widget.Later;
import rampwright.web.widget.Section;
import rampwright.web.widget.SettingWords;
import rampwright.web.work.Desk;
import rampwright.web.work.LapStudy;

/** One setting's lap, at the driver's limits and beside it at the car's. */
@Route("lap")
@PageTitle("Lap · Rampwright")
@Menu(title = "Lap", order = 2)
class LapView extends Div {
  private static final long serialVersionUID = 1L;

  private final transient Event event;
  private final transient Desk desk;
  private final Select<NamedSetting> setting;
  private final Select<WeightedCircuit> circuit;
  private final Later result;

  /** The laps of one setting. */
  private record Pair(LapStudy driver, LapStudy car) {}

  LapView(EventStore events, Desk desk) {
    this.event = events.open().event();
    this.desk = desk;
    this.result = new Later(desk);
    addClassName("rw-view");
    setting = Choice.of("Setting", event.settings(), event.current(), this::words, this::refresh);
    setting.addClassName("rw-choice-wide");
    WeightedCircuit first = event.circuits().get(0);
    circuit = Choice.of("Circuit", event.circuits(), first, c -> c.circuit().name(), this::refresh);
    circuit.setVisible(event.circuits().size() > 1);
    Div choices = new Div(setting, circuit);
    choices.addClassName("rw-row");
    Div head = new Div(new H1("Lap"), choices);
    head.addClassName("rw-head");
    add(head, result);
    refresh();
  }

  private String words(NamedSetting of) {
    boolean now = of.name().equals(event.currentSetting());
    return of.name() + (now ? " (in the car now): " : ": ") + SettingWords.parts(of);
  }

  private void refresh() {
    NamedSetting chosen = setting.getValue();
    Circuit line = circuit.getValue().circuit();
    result.show(
        "Solving the lap of " + line.name() + " at the driver's and at the car's limits",
        progress -> {
          LapStudy driver = desk.study(event, chosen, line, LimitForm.DRIVER);
          progress.accept(0.5);
          return new Pair(driver, desk.study(event, chosen, line, LimitForm.CAR));
        },
        this::draw);
  }

  private Component draw(Pair laps) {
    Div sections =
        new Div(
            new SummaryPanel(laps.driver(), laps.car()),
            new LapMap(laps.driver()),
            new Section(
                    "Corner by corner, at the driver's limits",
                    new CornerTable(laps.driver().report(), laps.car().report()))
                .wide(),
            new TracesPanel(event, laps.driver(), laps.car()).wide());
    sections.addClassName("rw-sections");
    return new Div(
        sections,
        new Assumptions(
            "Quasi-steady state: at each station the car is in equilibrium with the line's"
                + " curvature and its own acceleration.",
            "The line is driven exactly; the driver changes from one limit to the other at once.",
            "At the driver's limits the driver backs off before a slide grows faster than the rates"
                + " of the event; at the car's limits the tyres alone decide.",
            "Torque difference is always the whole difference between the two outputs."));
  }
}
