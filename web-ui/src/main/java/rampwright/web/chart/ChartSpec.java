package rampwright.web.chart;

import java.util.List;

/**
 * What the element in the browser draws, as plain data. Points are {@code [x, y]}, places of a map
 * {@code [distance, x, y, shade]}; a value that is not known is {@code null}.
 *
 * @param kind {@code lines}, {@code points} or {@code map}
 * @param group charts of one group move their cursors together; empty for a chart of its own
 * @param x horizontal axis
 * @param y vertical axis
 * @param series what is drawn against the axes
 * @param marks places on the horizontal axis with a name
 * @param places a circuit seen from above
 * @param labels names on a map
 * @param value what the shades of a map mean; null where it has none
 */
record ChartSpec(
    String kind,
    String group,
    Axis x,
    Axis y,
    List<Series> series,
    List<Mark> marks,
    List<List<Double>> places,
    List<MapLabel> labels,
    ShadeValue value) {

  /**
   * One line or cloud of points.
   *
   * @param name its name in the legend
   * @param colour name of a colour of the page
   * @param dash {@code solid}, {@code dashed}, {@code dotted} or {@code mixed}
   * @param step whether the value holds from one point to the next
   * @param scatter whether its points are not joined
   * @param symbol shape of the points
   * @param data its points
   */
  record Series(
      String name,
      String colour,
      String dash,
      boolean step,
      boolean scatter,
      String symbol,
      List<List<Double>> data) {}

  /** A name at a place (in the unit of the horizontal axis). */
  record Mark(double x, String label) {}

  /** A name at a place of a map (m). */
  record MapLabel(double x, double y, String text) {}

  /** What a shade of 1 stands for. */
  record ShadeValue(String label, String unit, double full) {}
}
