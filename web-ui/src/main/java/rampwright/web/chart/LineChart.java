package rampwright.web.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import rampwright.web.chart.ChartSpec.Mark;
import rampwright.web.chart.ChartSpec.Series;

/** Describes a chart of lines or points against two axes. */
public final class LineChart {
  private final String title;
  private final Axis x;
  private final Axis y;
  private final List<Series> series = new ArrayList<>();
  private final List<Mark> marks = new ArrayList<>();
  private final List<String> words = new ArrayList<>();
  private String group = "";

  /**
   * Starts a chart.
   *
   * @param title what it is about
   * @param x horizontal axis
   * @param y vertical axis
   */
  public LineChart(String title, Axis x, Axis y) {
    this.title = title;
    this.x = x;
    this.y = y;
  }

  /** Moves its cursor together with the other charts of a group. */
  public LineChart group(String newGroup) {
    this.group = newGroup;
    return this;
  }

  /**
   * Adds a line.
   *
   * @param name name in the legend
   * @param colour which colour and dash of the palette
   * @param xs places, in the unit of the horizontal axis
   * @param ys values, in the unit of the vertical axis; NaN leaves a gap
   */
  public LineChart line(String name, int colour, double[] xs, double[] ys) {
    return add(name, colour, false, xs, ys);
  }

  /** Adds points that are not joined; otherwise as {@link #line}. */
  public LineChart points(String name, int colour, double[] xs, double[] ys) {
    return add(name, colour, true, xs, ys);
  }

  /** Adds a line whose value holds until the next point. */
  public LineChart steps(String name, int colour, double[] xs, double[] ys) {
    words.add(words(name, xs, ys));
    series.add(
        new Series(
            name,
            Palette.colour(colour),
            Palette.dash(colour),
            true,
            false,
            Palette.symbol(colour),
            Points.of(xs, ys)));
    return this;
  }

  /** Marks a place on the horizontal axis. */
  public LineChart mark(double place, String label) {
    marks.add(new Mark(place, label));
    return this;
  }

  /** Returns the chart as a component. */
  public ChartFigure figure() {
    boolean joined = series.stream().noneMatch(Series::scatter);
    ChartSpec spec =
        new ChartSpec(
            joined ? "lines" : "points", group, x, y, series, marks, List.of(), List.of(), null);
    return new ChartFigure(title, spec, words);
  }

  private LineChart add(String name, int colour, boolean scatter, double[] xs, double[] ys) {
    words.add(words(name, xs, ys));
    series.add(
        new Series(
            name,
            Palette.colour(colour),
            Palette.dash(colour),
            false,
            scatter,
            Palette.symbol(colour),
            Points.of(xs, ys)));
    return this;
  }

  private String words(String name, double[] xs, double[] ys) {
    int least = -1;
    int most = -1;
    for (int i = 0; i < ys.length; i++) {
      if (Double.isFinite(ys[i])) {
        least = least < 0 || ys[i] < ys[least] ? i : least;
        most = most < 0 || ys[i] > ys[most] ? i : most;
      }
    }
    if (least < 0) {
      return name + ": no values";
    }
    return String.format(
        Locale.ROOT,
        "%s: %s between %s at %s and %s at %s",
        name,
        y.label(),
        shown(ys[least], y.unit()),
        shown(xs[least], x.unit()),
        shown(ys[most], y.unit()),
        shown(xs[most], x.unit()));
  }

  private static String shown(double value, String unit) {
    String number = String.format(Locale.ROOT, Math.abs(value) >= 100 ? "%.0f" : "%.3g", value);
    return unit.isEmpty() ? number : number + " " + unit;
  }
}
