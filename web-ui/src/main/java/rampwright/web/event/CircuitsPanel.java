package rampwright.web.event;

import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.router.RouterLink;
import java.util.ArrayList;
import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Station;
import rampwright.web.chart.MapChart;
import rampwright.web.store.EventChange;
import rampwright.web.widget.Facts;
import rampwright.web.widget.Section;
import rampwright.web.widget.Shown;

/** Where it is raced. */
final class CircuitsPanel extends Section {
  private static final long serialVersionUID = 1L;

  CircuitsPanel(Event event, EventEditor editor) {
    super(event.circuits().size() == 1 ? "Circuit" : "Circuits");
    Div all = new Div();
    all.addClassName("rw-circuits");
    for (WeightedCircuit weighted : event.circuits()) {
      all.add(circuit(event, weighted, editor));
    }
    add(all, new RouterLink("Circuit from a file: logged lap, stations or line", ImportView.class));
  }

  private static Div circuit(Event event, WeightedCircuit weighted, EventEditor editor) {
    Circuit circuit = weighted.circuit();
    List<Station> stations = circuit.stations();
    MapChart map = new MapChart(circuit.name(), words(circuit));
    for (Station station : stations) {
      map.place(station.distance(), station.x(), station.y());
    }
    if (circuit.closed()) {
      map.place(circuit.length(), stations.get(0).x(), stations.get(0).y());
    }
    Facts facts =
        new Facts()
            .with("Length", Shown.of(circuit.length(), 0, "m"))
            .with("Runs", circuit.closed() ? "round, " + sense(circuit) : "from start to finish")
            .with("Tightest radius", Shown.of(1 / tightest(circuit), 1, "m"))
            .with("Weight in the search", Shown.of(WeightedCircuit.WEIGHT, weighted.weight()));
    Div card = new Div(map.figure().height("13rem"), facts);
    card.addClassName("rw-circuit");
    if (event.circuits().size() > 1) {
      card.add(new Button("Leave out", click -> editor.change(e -> without(e, circuit.name()))));
    }
    return card;
  }

  private static Event without(Event event, String name) {
    List<WeightedCircuit> kept = new ArrayList<>(event.circuits());
    kept.removeIf(weighted -> weighted.circuit().name().equals(name));
    return EventChange.circuits(event, kept);
  }

  private static String words(Circuit circuit) {
    return "the line of "
        + circuit.name()
        + ", "
        + Shown.of(circuit.length(), 0, "m")
        + (circuit.closed() ? ", " + sense(circuit) : "");
  }

  private static String sense(Circuit circuit) {
    double turning = 0;
    List<Station> stations = circuit.stations();
    for (int i = 0; i < stations.size(); i++) {
      double end = i + 1 < stations.size() ? stations.get(i + 1).distance() : circuit.length();
      turning += stations.get(i).curvature() * (end - stations.get(i).distance());
    }
    return turning > 0 ? "anticlockwise" : "clockwise";
  }

  private static double tightest(Circuit circuit) {
    return circuit.stations().stream()
        .mapToDouble(station -> Math.abs(station.curvature()))
        .max()
        .orElse(0);
  }
}
