package rampwright.web.event;

import com.vaadin.flow.component.UI;
import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.Image;
import com.vaadin.flow.component.html.ListItem;
import com.vaadin.flow.component.html.UnorderedList;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Base64;
import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.survey.ImportPlot;
import rampwright.vehicle.circuit.survey.ImportReport;
import rampwright.vehicle.circuit.survey.ImportedCircuit;
import rampwright.vehicle.input.InvalidInput;
import rampwright.web.store.EventChange;
import rampwright.web.store.EventStore;
import rampwright.web.widget.Facts;
import rampwright.web.widget.Notice;
import rampwright.web.widget.Section;

/** The circuit that a file gave, to be judged and then taken into the event or left. */
final class ImportResult extends Section {
  private static final long serialVersionUID = 1L;

  private final transient EventStore events;
  private final Div answer;

  ImportResult(ImportedCircuit imported, EventStore events, Div answer) {
    super("3 Judge it: " + imported.circuit().name());
    this.events = events;
    this.answer = answer;
    Circuit circuit = imported.circuit();
    Button replace = new Button("Race on this circuit alone", click -> take(circuit, true));
    Button add = new Button("Add it to the event's circuits", click -> take(circuit, false));
    Div buttons = new Div(replace, add);
    buttons.addClassName("rw-row");
    for (String warning : imported.report().warnings()) {
      add(Notice.error(warning));
    }
    Div columns = new Div(plot(imported), report(imported.report()));
    columns.addClassName("rw-columns");
    add(buttons, columns);
  }

  private static Image plot(ImportedCircuit imported) {
    byte[] svg = ImportPlot.svg(imported).getBytes(StandardCharsets.UTF_8);
    Image image =
        new Image(
            "data:image/svg+xml;base64," + Base64.getEncoder().encodeToString(svg),
            "Map, logged speed and curvature of " + imported.circuit().name());
    image.addClassName("rw-plot");
    return image;
  }

  private static Div report(ImportReport report) {
    Facts facts = new Facts();
    facts.with("File", report.file()).with("Taken for", report.source());
    report.figures().forEach((figure, value) -> facts.with(figure.label(), figure.shown(value)));
    UnorderedList notes = new UnorderedList();
    report.notes().forEach(note -> notes.add(new ListItem(note)));
    return new Div(facts, notes);
  }

  private void take(Circuit circuit, boolean alone) {
    answer.removeAll();
    try {
      events.change(event -> with(event, circuit, alone));
      UI.getCurrent().navigate(EventView.class);
    } catch (InvalidInput e) {
      answer.add(Notice.error(e.getMessage()));
    }
  }

  private static Event with(Event event, Circuit circuit, boolean alone) {
    List<WeightedCircuit> circuits = new ArrayList<>(alone ? List.of() : event.circuits());
    boolean known =
        circuits.stream().anyMatch(other -> other.circuit().name().equals(circuit.name()));
    if (known) {
      throw InvalidInput.of(
          "name of the circuit",
          circuit.name(),
          "unique in the event",
          "leave the other one out on the Event page first");
    }
    circuits.add(new WeightedCircuit(circuit, 1));
    return EventChange.circuits(event, circuits);
  }
}
