package rampwright.web.lap;

import java.util.stream.Collectors;
import rampwright.vehicle.balance.CornerReport;
import rampwright.vehicle.circuit.Circuit;
import rampwright.web.chart.MapChart;
import rampwright.web.widget.Section;
import rampwright.web.widget.Shown;
import rampwright.web.work.LapStudy;
import rampwright.web.work.LapTrace;
import rampwright.web.work.LinePlaces;

/** The circuit from above with the corners' numbers; shows where the cursor of the traces is. */
final class LapMap extends Section {
  private static final long serialVersionUID = 1L;

  LapMap(LapStudy study) {
    super("Circuit");
    Circuit circuit = study.lap().request().circuit();
    LinePlaces places = new LinePlaces(circuit);
    MapChart map = new MapChart(circuit.name(), words(study)).group(TracesPanel.GROUP);
    double[] distance = new LapTrace(study.lap()).distance();
    for (double at : distance) {
      LinePlaces.Place place = places.at(at);
      map.place(at, place.x(), place.y());
    }
    if (circuit.closed()) {
      LinePlaces.Place start = places.at(0);
      map.place(circuit.length(), start.x(), start.y());
    }
    for (CornerReport corner : study.report().corners()) {
      LinePlaces.Place place = places.at(corner.apexDistance());
      map.label(place.x(), place.y(), String.valueOf(corner.number()));
    }
    add(map.figure().height("19rem"));
  }

  private static String words(LapStudy study) {
    return study.report().corners().stream()
        .map(
            corner ->
                "corner "
                    + corner.number()
                    + (corner.left() ? " left at " : " right at ")
                    + Shown.of(corner.apexDistance(), 0, "m"))
        .collect(Collectors.joining(", "));
  }
}
