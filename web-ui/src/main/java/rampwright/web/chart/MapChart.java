package rampwright.web.chart;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import rampwright.web.chart.ChartSpec.MapLabel;
import rampwright.web.chart.ChartSpec.ShadeValue;

/** Describes a circuit seen from above, plain or in shades of gain and loss. */
public final class MapChart {
  private final String title;
  private final List<List<Double>> places = new ArrayList<>();
  private final List<MapLabel> labels = new ArrayList<>();
  private final List<String> words = new ArrayList<>();
  private String group = "";
  private ShadeValue value;

  /**
   * Starts a map.
   *
   * @param title what it is about
   * @param words what it shows, for those who do not see it
   */
  public MapChart(String title, String words) {
    this.title = title;
    this.words.add(words);
  }

  /** Shows where the cursor of the charts of a group is. */
  public MapChart group(String newGroup) {
    this.group = newGroup;
    return this;
  }

  /** Adds a place with no shade: distance along the line (m) and position (m). */
  public MapChart place(double distance, double x, double y) {
    return place(distance, x, y, Double.NaN);
  }

  /** Adds a place and the shade of the stretch from it to the next, -1 (loss) to 1 (gain). */
  public MapChart place(double distance, double x, double y, double shade) {
    places.add(
        Arrays.asList(
            Points.rounded(distance), Points.rounded(x), Points.rounded(y), Points.rounded(shade)));
    return this;
  }

  /** Writes a name at a place (m). */
  public MapChart label(double x, double y, String text) {
    labels.add(new MapLabel(x, y, text));
    return this;
  }

  /**
   * Says what the shades mean.
   *
   * @param label what is shown
   * @param unit its unit
   * @param full what shade 1 stands for, in that unit
   */
  public MapChart shades(String label, String unit, double full) {
    value = new ShadeValue(label, unit, full);
    words.add(String.format(Locale.ROOT, "full colour: %s of %.3g %s", label, full, unit));
    return this;
  }

  /** Returns the map as a component. */
  public ChartFigure figure() {
    Axis none = Axis.of("", "m");
    ChartSpec spec =
        new ChartSpec("map", group, none, none, List.of(), List.of(), places, labels, value);
    return new ChartFigure(title, spec, words);
  }
}
