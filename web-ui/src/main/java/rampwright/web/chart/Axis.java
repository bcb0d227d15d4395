package rampwright.web.chart;

/**
 * An axis of a chart.
 *
 * @param label what it shows
 * @param unit unit of its numbers, empty for a pure number
 * @param min where it starts; null to follow the data
 * @param max where it ends; null to follow the data
 */
public record Axis(String label, String unit, Double min, Double max) {
  /** Distance along a lap. */
  public static final Axis DISTANCE = of("distance", "m");

  /** Returns an axis that follows the data. */
  public static Axis of(String label, String unit) {
    return new Axis(label, unit, null, null);
  }

  /** Returns an axis that starts at zero. */
  public static Axis fromZero(String label, String unit) {
    return new Axis(label, unit, 0.0, null);
  }
}
