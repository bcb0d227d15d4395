package rampwright.vehicle.circuit.survey;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Station;

/** Grade from measured heights: the slope of the smoothed height over distance. */
final class HeightGrade {
  /**
   * Heights are smoothed over at least this length (m): a satellite receiver is vague in height.
   */
  private static final double HEIGHT_SMOOTHING = 80;

  private HeightGrade() {}

  /**
   * Returns a flat circuit with its grade.
   *
   * @param height (m) over distance (m)
   */
  static Circuit on(Circuit flat, Curve height, ImportOptions options, ImportReport.Draft report) {
    int stations = flat.stations().size();
    double spacing = flat.stations().get(1).distance();
    boolean closed = flat.closed();
    // a lap ends at the height at which it began: what is left is drift of the sensor
    double drift = closed ? (height.within(flat.length()) - height.y(0)) / flat.length() : 0;
    double[] even = new double[stations];
    for (int i = 0; i < stations; i++) {
      even[i] = height.within(i * spacing) - drift * i * spacing;
    }
    double length = Math.max(HEIGHT_SMOOTHING, options.smoothing());
    double[] smooth = Smoothing.smooth(even, closed, spacing, length);
    List<Station> graded = new ArrayList<>();
    double lowest = smooth[0];
    double highest = smooth[0];
    for (int i = 0; i < stations; i++) {
      lowest = Math.min(lowest, smooth[i]);
      highest = Math.max(highest, smooth[i]);
      graded.add(withGrade(flat.stations().get(i), grade(smooth, i, closed, spacing)));
    }
    report.set(Figure.CLIMB, highest - lowest);
    report.note(
        String.format(
            Locale.ROOT, "The grade comes from the heights, smoothed over %.0f m.", length));
    return new Circuit(flat.name(), flat.closed(), flat.length(), graded);
  }

  private static double grade(double[] height, int i, boolean closed, double spacing) {
    int before = closed ? Math.floorMod(i - 1, height.length) : Math.max(0, i - 1);
    int after = closed ? (i + 1) % height.length : Math.min(height.length - 1, i + 1);
    int steps = closed ? 2 : after - before;
    return Math.atan((height[after] - height[before]) / (steps * spacing));
  }

  private static Station withGrade(Station flat, double grade) {
    return new Station(flat.distance(), flat.curvature(), flat.x(), flat.y(), grade, 0, 1, 1);
  }
}
