package rampwright.web.compare;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.combobox.MultiSelectComboBox;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H1;
import com.vaadin.flow.component.select.Select;
import com.vaadin.flow.router.BeforeEnterEvent;
import com.vaadin.flow.router.BeforeEnterObserver;
import com.vaadin.flow.router.Menu;
import com.vaadin.flow.router.PageTitle;
import com.vaadin.flow.router.Route;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.lap.LimitForm;
import rampwright.web.chart.Palette;
import rampwright.web.store.EventStore;
import rampwright.web.widget.Assumptions;
import rampwright.web.widget.Choice;
import rampwright.web.widget.Later;
import rampwright.web.widget.Notice;
import rampwright.web.widget.Section;
import rampwright.web.work.Desk;
import rampwright.web.work.LapStudy;

/** Two to four settings side by side; the first is what the others are held against. */
@Route("compare")
@PageTitle("Compare · Rampwright")
@Menu(title = "Compare", order = 4)
class CompareView extends Div implements BeforeEnterObserver {
  private static final long serialVersionUID = 1L;

  /** Query parameter that names a setting; may stand several times. */
  static final String SETTING = "setting";

  private final transient Event event;
  private final transient Desk desk;
  private final MultiSelectComboBox<NamedSetting> settings =
      new MultiSelectComboBox<>("Settings, the first is the reference");
  private final Select<WeightedCircuit> circuit;
  private final Select<LimitForm> form;
  private final WhatIfPanel whatIf;
  private final Later result;

  CompareView(EventStore events, Desk desk) {
    this.event = events.open().event();
    this.desk = desk;
    this.result = new Later(desk);
    addClassName("rw-view");
    settings.addClassName("rw-choice-wide");
    settings.setItemLabelGenerator(NamedSetting::name);
    settings.setItems(event.settings());
    WeightedCircuit first = event.circuits().get(0);
    circuit = Choice.of("Circuit", event.circuits(), first, c -> c.circuit().name(), this::refresh);
    circuit.setVisible(event.circuits().size() > 1);
    form =
        Choice.of(
            "Limits",
            List.of(LimitForm.values()),
            LimitForm.DRIVER,
            f -> f == LimitForm.DRIVER ? "driver's" : "car's",
            this::refresh);
    whatIf = new WhatIfPanel(event, events, this::refresh);
    Div choices = new Div(settings, circuit, form);
    choices.addClassName("rw-row");
    Div head = new Div(new H1("Compare"), choices);
    head.addClassName("rw-head");
    add(head, whatIf, result);
  }

  @Override
  public void beforeEnter(BeforeEnterEvent enter) {
    List<String> names =
        enter.getLocation().getQueryParameters().getParameters().getOrDefault(SETTING, List.of());
    List<NamedSetting> wanted = new ArrayList<>();
    for (String name : new LinkedHashSet<>(names)) {
      event.settings().stream().filter(s -> s.name().equals(name)).forEach(wanted::add);
    }
    if (wanted.size() < 2) {
      wanted.clear();
      wanted.add(event.current());
      event.settings().stream().filter(s -> !wanted.contains(s)).findFirst().ifPresent(wanted::add);
    }
    settings.setValue(wanted.toArray(NamedSetting[]::new));
    settings.addValueChangeListener(change -> refresh());
    refresh();
  }

  private void refresh() {
    List<NamedSetting> chosen = new ArrayList<>(settings.getSelectedItems());
    whatIf.setting().ifPresent(chosen::add);
    if (chosen.size() < 2 || chosen.size() > Palette.SIZE) {
      result.show(
          Notice.empty(
              "Choose two to four settings, what if included ("
                  + chosen.size()
                  + " are chosen now)."));
      return;
    }
    Circuit line = circuit.getValue().circuit();
    LimitForm limits = form.getValue();
    result.show(
        "Solving " + chosen.size() + " laps of " + line.name(),
        progress -> {
          List<LapStudy> studies = new ArrayList<>();
          for (NamedSetting setting : chosen) {
            studies.add(desk.study(event, setting, line, limits));
            progress.accept((double) studies.size() / chosen.size());
          }
          return Comparison.of(studies);
        },
        this::draw);
  }

  private Component draw(Comparison comparison) {
    Div sections =
        new Div(
            new Section("Lap times and where they come from", new GapTable(comparison)).wide(),
            new GainMap(comparison),
            new LockDiagram(comparison),
            new GapTraces(comparison).wide(),
            new Section(
                    "By corner and phase of "
                        + comparison.reference().setting().name()
                        + ": what the others gain (−) or lose (+)",
                    new PhaseTable(comparison))
                .wide());
    sections.addClassName("rw-sections");
    return new Div(
        sections,
        new Assumptions(
            "Laps are quasi-steady and follow the line exactly; the same line for every setting.",
            "A gap is shared out to where its speed difference came from: an exit that was better"
                + " counts along the straight behind it. Another split with the same sum is"
                + " possible.",
            "By corner and phase the laps are timed between the same two stations.",
            "The friction between plates scatters by about ±15 % (common practice, no source); a"
                + " few hundredths of a second are within what that does to a lap."));
  }
}
