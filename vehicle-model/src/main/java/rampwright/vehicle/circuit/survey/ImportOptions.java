package rampwright.vehicle.circuit.survey;

import java.util.OptionalInt;
import rampwright.vehicle.input.Quantity;

/**
 * How a file becomes a circuit.
 *
 * @param columns which columns hold what, for CSV files
 * @param smoothing smoothing length (m): a wave of curvature of this length keeps half its height,
 *     longer ones keep more; 0 for none
 * @param spacing wanted distance between stations (m); rounded so that a whole number fits the lap
 * @param closed whether the end of the line joins its start
 * @param longestDropout longest stretch of missing values in a logged lap that is bridged (s)
 * @param lap number of the lap to take from a log with a lap column; empty for the fastest
 */
public record ImportOptions(
    ColumnMapping columns,
    double smoothing,
    double spacing,
    boolean closed,
    double longestDropout,
    OptionalInt lap) {
  public static final Quantity SMOOTHING =
      Quantity.si("smoothing_m", "smoothing length", "m", 0, 200, "");
  public static final Quantity SPACING =
      Quantity.si("spacing_m", "distance between stations", "m", 0.2, 50, "");
  public static final Quantity LONGEST_DROPOUT =
      Quantity.si("longest_dropout_s", "longest dropout that is bridged", "s", 0, 10, "");

  /** Checks the numbers. */
  public ImportOptions {
    SMOOTHING.check(smoothing);
    SPACING.check(spacing);
    LONGEST_DROPOUT.check(longestDropout);
  }

  /**
   * Returns a closed lap with guessed columns, smoothed over 15 m, at 2 m, dropouts up to 1 s
   * bridged.
   */
  public static ImportOptions defaults() {
    return new ImportOptions(ColumnMapping.GUESSED, 15, 2, true, 1, OptionalInt.empty());
  }

  /** Returns the rule for dropouts in words. */
  String dropoutRule() {
    return "at most " + shown(longestDropout) + " s to be bridged";
  }

  private static String shown(double value) {
    return value == Math.rint(value) ? Long.toString((long) value) : Double.toString(value);
  }

  /** Returns these options with a mapping as a user writes it ({@link ColumnMapping#parse}). */
  public ImportOptions withColumns(String mapping) {
    ColumnMapping parsed = ColumnMapping.parse(mapping);
    return new ImportOptions(parsed, smoothing, spacing, closed, longestDropout, lap);
  }

  /** Returns these options with another smoothing length (m). */
  public ImportOptions withSmoothing(double length) {
    return new ImportOptions(columns, length, spacing, closed, longestDropout, lap);
  }

  /** Returns these options with another distance between stations (m). */
  public ImportOptions withSpacing(double distance) {
    return new ImportOptions(columns, smoothing, distance, closed, longestDropout, lap);
  }

  /** Returns these options for a closed lap or an open run. */
  public ImportOptions withClosed(boolean isClosed) {
    return new ImportOptions(columns, smoothing, spacing, isClosed, longestDropout, lap);
  }

  /** Returns these options with another longest dropout (s). */
  public ImportOptions withLongestDropout(double seconds) {
    return new ImportOptions(columns, smoothing, spacing, closed, seconds, lap);
  }

  /** Returns these options for one lap of a log with a lap column. */
  public ImportOptions withLap(int number) {
    OptionalInt one = OptionalInt.of(number);
    return new ImportOptions(columns, smoothing, spacing, closed, longestDropout, one);
  }
}
