package rampwright.vehicle.circuit.survey;

import java.util.Arrays;
import rampwright.vehicle.input.InvalidInput;

/**
 * Finds and bridges what a sensor did not measure: missing values, single values out of line, and a
 * value that is held while the sensor is silent.
 *
 * <p>A value is out of line when it lies further from the median of the seven around it than six
 * times their median absolute deviation (times 1.4826, which makes it a standard deviation for
 * normal noise; Hampel 1974) and than a floor. A value is held when it repeats for at least 0.25 s
 * and five times longer than its column usually repeats one, and then steps by more than three of
 * the column's usual steps. Bridges are straight.
 */
final class Dropouts {
  private static final int SIDE = 3;
  private static final double SIGMAS = 6;
  private static final double MAD_TO_SIGMA = 1.4826;

  /** Below this sampling rate (Hz) the peak of a chicane may be a single value. */
  private static final double FAST = 10;

  private static final double SHORTEST_HOLD = 0.25;
  private static final int HOLD_RATIO = 5;
  private static final int STEP_RATIO = 3;

  private final LogSamples samples;
  private final ImportOptions options;
  private int spikes;
  private int bridges;
  private int values;
  private double longest;

  Dropouts(LogSamples samples, ImportOptions options) {
    this.samples = samples;
    this.options = options;
  }

  /**
   * Returns a column without dropouts.
   *
   * @param column which
   * @param floor smallest deviation of a value that is out of line (SI)
   */
  double[] repaired(Column column, double floor) {
    double[] repaired = samples.values(column);
    if (1 / samples.interval() >= FAST) {
      dropSpikes(repaired, floor);
    }
    dropHolds(repaired);
    bridge(column, repaired);
    return repaired;
  }

  void report(ImportReport.Draft report) {
    report.set(Figure.SPIKES, spikes);
    report.set(Figure.DROPOUTS, bridges);
    report.set(Figure.BRIDGED, values);
    report.set(Figure.LONGEST_DROPOUT, longest);
  }

  private void dropSpikes(double[] column, double floor) {
    double[] before = column.clone();
    for (int i = SIDE; i < before.length - SIDE; i++) {
      double[] around =
          Arrays.stream(before, i - SIDE, i + SIDE + 1).filter(v -> !Double.isNaN(v)).toArray();
      if (around.length > SIDE && !Double.isNaN(before[i])) {
        double median = LogSamples.median(around);
        double[] apart = Arrays.stream(around).map(v -> Math.abs(v - median)).toArray();
        double most = Math.max(floor, SIGMAS * MAD_TO_SIGMA * LogSamples.median(apart));
        if (Math.abs(before[i] - median) > most) {
          column[i] = Double.NaN;
          spikes++;
        }
      }
    }
  }

  private void dropHolds(double[] column) {
    Series lengths = new Series();
    Series steps = new Series();
    for (int i = 0; i < column.length; i = endOfRun(column, i)) {
      int end = endOfRun(column, i);
      lengths.add(end - i);
      if (end < column.length && !Double.isNaN(column[end] - column[i])) {
        steps.add(Math.abs(column[end] - column[i]));
      }
    }
    if (steps.size() == 0) {
      return;
    }
    double usualStep = LogSamples.median(steps.toArray());
    double shortest =
        Math.max(
            SHORTEST_HOLD / samples.interval(), HOLD_RATIO * LogSamples.median(lengths.toArray()));
    for (int i = 0; i < column.length; ) {
      int end = endOfRun(column, i);
      boolean jumps =
          end < column.length && Math.abs(column[end] - column[i]) > STEP_RATIO * usualStep;
      if (end - i >= shortest && jumps) {
        // the first of equal values was measured
        Arrays.fill(column, i + 1, end, Double.NaN);
      }
      i = end;
    }
  }

  private static int endOfRun(double[] column, int from) {
    int end = from + 1;
    while (end < column.length && column[end] == column[from]) {
      end++;
    }
    return end;
  }

  private void bridge(Column kind, double[] column) {
    for (int i = 0; i < column.length; i++) {
      if (Double.isNaN(column[i])) {
        int end = i;
        while (end < column.length && Double.isNaN(column[end])) {
          end++;
        }
        check(kind, i, end);
        fill(column, i, end);
        bridges++;
        values += end - i;
      }
    }
  }

  private void check(Column kind, int from, int end) {
    double length =
        samples.time(Math.min(end, samples.size() - 1)) - samples.time(Math.max(0, from - 1));
    if (length > options.longestDropout() + samples.interval() + 1e-9) {
      throw InvalidInput.value(
              "dropout of the " + kind.label(),
              length,
              "s",
              options.dropoutRule(),
              "choose another lap, or allow a longer dropout")
          .at(samples.place(from));
    }
    longest = Math.max(longest, length);
  }

  private void fill(double[] column, int from, int end) {
    for (int i = from; i < end; i++) {
      if (from == 0 || end == column.length) {
        column[i] = from == 0 ? column[end] : column[from - 1];
      } else {
        double share =
            (samples.time(i) - samples.time(from - 1))
                / (samples.time(end) - samples.time(from - 1));
        column[i] = column[from - 1] + share * (column[end] - column[from - 1]);
      }
    }
  }
}
