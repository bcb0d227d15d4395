package rampwright.vehicle.circuit.survey;

import java.util.Arrays;
import java.util.function.IntToDoubleFunction;
import rampwright.vehicle.input.InvalidInput;

/**
 * The samples of one lap in the order of time. Rows without time or with the time of the row before
 * are left out; where rows are missing, empty samples stand in at the usual interval.
 */
final class LogSamples {
  private static final int FEWEST = 100;

  /** An interval of so many usual ones is a gap. */
  private static final double GAP = 1.5;

  /** Slowest sampling (Hz) at which a tight corner is seen by a handful of samples. */
  private static final double SLOWEST_RATE = 5;

  private static final int NO_ROW = -1;

  private final CsvTable table;
  private final double[] time;
  private final int[] rows;
  private final double interval;

  private LogSamples(CsvTable table, double[] time, int[] rows, double interval) {
    this.table = table;
    this.time = time;
    this.rows = rows;
    this.interval = interval;
  }

  static LogSamples of(
      CsvTable table, LapRows lap, ImportOptions options, ImportReport.Draft report) {
    int[] kept = keptRows(table, lap, report);
    if (kept.length < FEWEST) {
      throw InvalidInput.of(
              "number of samples with a time",
              Integer.toString(kept.length),
              "at least " + FEWEST,
              "export the whole lap at 10 Hz or more")
          .at(table.file());
    }
    Series time = table.get(Column.TIME);
    double[] steps = new double[kept.length - 1];
    for (int i = 0; i < steps.length; i++) {
      steps[i] = time.get(kept[i + 1]) - time.get(kept[i]);
    }
    double interval = median(steps);
    Series times = new Series();
    Series rows = new Series();
    for (int i = 0; i < kept.length; i++) {
      double step = i == 0 ? 0 : steps[i - 1];
      if (step > GAP * interval) {
        checkGap(table, kept[i], step, options);
        int missing = (int) Math.round(step / interval) - 1;
        for (int k = 1; k <= missing; k++) {
          times.add(time.get(kept[i - 1]) + k * step / (missing + 1));
          rows.add(NO_ROW);
        }
      }
      times.add(time.get(kept[i]));
      rows.add(kept[i]);
    }
    report.set(Figure.SAMPLES, kept.length);
    report.set(Figure.SAMPLE_RATE, 1 / interval);
    if (1 / interval < SLOWEST_RATE) {
      report.warn("Few samples a second: a tight corner is seen by too few of them.");
    }
    int[] all = Arrays.stream(rows.toArray()).mapToInt(row -> (int) row).toArray();
    return new LogSamples(table, times.toArray(), all, interval);
  }

  private static int[] keptRows(CsvTable table, LapRows lap, ImportReport.Draft report) {
    Series time = table.get(Column.TIME);
    Series kept = new Series();
    int repeated = 0;
    double last = Double.NEGATIVE_INFINITY;
    for (int row = lap.from(); row <= lap.to(); row++) {
      double now = time.get(row);
      if (now < last) {
        throw InvalidInput.value(
                "time",
                now,
                "s",
                "at or after that of the row before it",
                "several laps with a clock of their own are in the file: export one of them")
            .at(table.place(row));
      }
      if (now > last) {
        kept.add(row);
        last = now;
      } else {
        repeated++;
      }
    }
    report.set(Figure.REPEATED, repeated);
    return Arrays.stream(kept.toArray()).mapToInt(row -> (int) row).toArray();
  }

  private static void checkGap(CsvTable table, int row, double step, ImportOptions options) {
    if (step > options.longestDropout() + 1e-9) {
      throw InvalidInput.value(
              "gap before this row",
              step,
              "s",
              options.dropoutRule(),
              "choose another lap, or allow a longer dropout")
          .at(table.place(row));
    }
  }

  static double median(double[] values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    return sorted[sorted.length / 2];
  }

  int size() {
    return time.length;
  }

  /** Returns the time of a sample (s). */
  double time(int i) {
    return time[i];
  }

  /** Returns the usual interval between samples (s). */
  double interval() {
    return interval;
  }

  /** Returns where a sample stands in the file; of a missing one, where the next stands. */
  String place(int i) {
    int at = i;
    while (rows[at] == NO_ROW) {
      at++;
    }
    return table.place(rows[at]);
  }

  /** Returns the value that a function has for the row of a sample, NaN where there is none. */
  double value(IntToDoubleFunction ofRow, int i) {
    return rows[i] == NO_ROW ? Double.NaN : ofRow.applyAsDouble(rows[i]);
  }

  /** Returns the values of a column, NaN where there is none. */
  double[] values(Column column) {
    Series series = table.get(column);
    double[] values = new double[rows.length];
    for (int i = 0; i < values.length; i++) {
      values[i] = value(series::get, i);
    }
    return values;
  }
}
