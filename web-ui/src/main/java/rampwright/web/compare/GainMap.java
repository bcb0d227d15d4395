package rampwright.web.compare;

import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.Span;
import com.vaadin.flow.component.select.Select;
import java.util.List;
import java.util.stream.IntStream;
import rampwright.vehicle.balance.CornerReport;
import rampwright.web.chart.ChartFigure;
import rampwright.web.chart.MapChart;
import rampwright.web.widget.Choice;
import rampwright.web.widget.Section;
import rampwright.web.widget.Shown;
import rampwright.web.work.LapTrace;
import rampwright.web.work.LinePlaces;

/**
 * The circuit from above in shades of where one setting gains on the reference and where it loses.
 */
final class GainMap extends Section {
  private static final long serialVersionUID = 1L;

  /** The gain is taken over this many stations, so that single stations do not flicker. */
  private static final int WINDOW = 10;

  private final transient Comparison comparison;
  private final Div place = new Div();
  private final Select<Integer> other;

  GainMap(Comparison comparison) {
    super("Where time is gained on " + comparison.reference().setting().name());
    this.comparison = comparison;
    List<Integer> others = IntStream.range(0, comparison.splits().size()).boxed().toList();
    other = Choice.of("Setting", others, 0, i -> name(i), this::draw);
    other.setVisible(others.size() > 1);
    add(other, place);
    draw();
  }

  private String name(int index) {
    return comparison.studies().get(index + 1).setting().name();
  }

  private void draw() {
    int index = other.getValue();
    double[] distance = new LapTrace(comparison.reference().lap()).distance();
    double[] rate = rate(distance, comparison.splits().get(index).gap());
    double full =
        IntStream.range(0, rate.length).mapToDouble(i -> Math.abs(rate[i])).max().orElse(0);
    LinePlaces places = new LinePlaces(comparison.circuit());
    String total = Shown.signed(comparison.splits().get(index).total(), 3, "s");
    MapChart map =
        new MapChart("", name(index) + ", gap over the lap " + total)
            .group(GapTraces.GROUP)
            .shades("time gained per 100 m", "s", full);
    for (int i = 0; i < distance.length; i++) {
      LinePlaces.Place at = places.at(distance[i]);
      map.place(distance[i], at.x(), at.y(), full == 0 ? 0 : rate[i] / full);
    }
    if (comparison.circuit().closed()) {
      LinePlaces.Place start = places.at(0);
      map.place(comparison.circuit().length(), start.x(), start.y());
    }
    for (CornerReport corner : comparison.corners()) {
      LinePlaces.Place at = places.at(corner.apexDistance());
      map.label(at.x(), at.y(), String.valueOf(corner.number()));
    }
    ChartFigure figure = map.figure().height("20rem");
    place.removeAll();
    place.add(figure, legend(name(index), full));
  }

  /** Returns the time gained per 100 m (s) around each station. */
  private static double[] rate(double[] distance, double[] gap) {
    double[] rate = new double[gap.length];
    for (int i = 0; i < gap.length; i++) {
      int from = Math.max(0, i - WINDOW / 2);
      int to = Math.min(gap.length - 1, i + WINDOW / 2);
      rate[i] = -100 * (gap[to] - gap[from]) / (distance[to] - distance[from]);
    }
    return rate;
  }

  private static Div legend(String name, double full) {
    Span bar = new Span();
    bar.addClassName("rw-legend-bar");
    String most = Shown.of(full, 3, "s per 100 m");
    Div legend = new Div(new Span(name + " loses " + most), bar, new Span("gains " + most));
    legend.addClassName("rw-legend");
    return legend;
  }
}
