package rampwright.vehicle.circuit.survey;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import rampwright.vehicle.input.InvalidInput;

/**
 * Finds a column whose unit is another than it claims, by quantities that the file holds twice: a
 * ratio that should be 1 and is that of two units betrays which.
 */
final class LogUnits {
  /** How near the ratio of two units a measured ratio must be to name the unit. */
  private static final double NEAR = 0.04;

  private final CsvTable table;
  private final ImportReport.Draft report;

  LogUnits(CsvTable table, ImportReport.Draft report) {
    this.table = table;
    this.report = report;
  }

  /** A column and the power with which its unit enters a ratio. */
  record Part(Column column, int power) {}

  /**
   * Checks a ratio that should be 1.
   *
   * @param ratio measured
   * @param slack largest deviation from 1 that passes
   * @param finding what was measured, for the message
   * @param parts the columns in the order of suspicion
   * @return whether it passed; a deviation that no unit explains is left to the caller
   * @throws InvalidInput when the unit of a column explains the deviation
   */
  boolean check(double ratio, double slack, String finding, Part... parts) {
    if (Math.abs(ratio - 1) <= slack) {
      return true;
    }
    for (Part part : parts) {
      Optional<MappedColumn> used = used(part.column());
      Optional<Unit> unit = used.flatMap(column -> truth(column.unit(), ratio, part.power()));
      if (unit.isPresent()) {
        throw InvalidInput.of(
                "unit of the column " + used.get().header(),
                used.get().unit().symbol(),
                unit.get().symbol() + " to agree with the rest of the file (" + finding + ")",
                "write "
                    + part.column().key()
                    + "="
                    + Header.of(used.get().header()).title()
                    + "["
                    + unit.get().symbol()
                    + "] in the column mapping")
            .at(table.headerPlace());
      }
    }
    return false;
  }

  private Optional<MappedColumn> used(Column column) {
    return table.mapped().stream().filter(mapped -> mapped.column() == column).findFirst();
  }

  private static Optional<Unit> truth(Unit claimed, double ratio, int power) {
    return Arrays.stream(Unit.values())
        .filter(unit -> unit != claimed && unit.dimension() == claimed.dimension())
        .filter(unit -> near(ratio, Math.pow(claimed.si() / unit.si(), power)))
        .findFirst();
  }

  private static boolean near(double ratio, double unitRatio) {
    return Math.abs(ratio / unitRatio - 1) <= NEAR;
  }

  /** Compares lateral acceleration with speed times yaw rate. */
  void lateral(double[] speed, double[] lateral, double[] yawRate) {
    double ratio = slope(times(speed, yawRate), lateral);
    String finding = text("lateral acceleration is %.2f times speed times yaw rate", ratio);
    if (ratio < 0) {
      throw opposite(Column.YAW_RATE, "lateral acceleration and yaw rate have opposite signs");
    }
    boolean passed =
        check(
            ratio,
            0.15,
            finding,
            new Part(Column.SPEED, -1),
            new Part(Column.LATERAL_ACCELERATION, 1),
            new Part(Column.YAW_RATE, -1));
    if (!passed) {
      report.warn("The columns disagree: " + finding + ".");
    }
  }

  /** Compares the change of speed with longitudinal acceleration. */
  void longitudinal(LogSamples samples, double[] speed, double[] acceleration) {
    int half = Math.max(1, (int) Math.round(0.25 / samples.interval()));
    int n = speed.length - 2 * half;
    double[] change = new double[n];
    double[] mean = new double[n];
    for (int i = 0; i < n; i++) {
      double time = samples.time(i + 2 * half) - samples.time(i);
      change[i] = (speed[i + 2 * half] - speed[i]) / time;
      mean[i] = Arrays.stream(acceleration, i, i + 2 * half + 1).average().orElseThrow();
    }
    double ratio = slope(mean, change);
    String finding =
        text("speed changes %.2f times as fast as longitudinal acceleration says", ratio);
    boolean passed =
        check(
            ratio,
            0.15,
            finding,
            new Part(Column.SPEED, 1),
            new Part(Column.LONGITUDINAL_ACCELERATION, -1),
            new Part(Column.TIME, -1));
    if (!passed) {
      report.warn("The columns disagree: " + finding + ".");
    }
  }

  /**
   * Compares two lengths of the same way (m).
   *
   * @throws InvalidInput when they differ by more than a twentieth
   */
  void lengths(double bySpeed, double byPosition) {
    String finding =
        text("the way is %.0f m long by speed and %.0f m by position", bySpeed, byPosition);
    boolean passed =
        check(
            bySpeed / byPosition,
            0.05,
            finding,
            new Part(Column.SPEED, 1),
            new Part(Column.TIME, 1),
            new Part(Column.X, -1));
    if (!passed) {
      throw InvalidInput.of(
              "length by speed",
              text("%.0f m", bySpeed),
              text("within 5 %% of the length by position, %.0f m", byPosition),
              "the positions belong to another lap, or a unit is wrong")
          .at(table.file());
    }
  }

  /**
   * Checks how much a closed lap turns. It turns once, or not at all in a figure of eight, and then
   * the turns to both sides still add up to a whole one at least (Fenchel 1929: the whole absolute
   * curvature of a closed curve is 2*pi or more).
   *
   * @param turning the whole turning (rad)
   * @param absolute the sum of turns to the left and to the right, both positive (rad)
   */
  void turning(double turning, double absolute) {
    boolean eight = Math.abs(turning) < 0.15 * 2 * Math.PI && absolute > 0.8 * 2 * Math.PI;
    if (!eight) {
      check(
          Math.abs(turning) / (2 * Math.PI),
          0.15,
          text("the lap turns by %.0f degrees instead of 360", Math.toDegrees(turning)),
          new Part(Column.SPEED, -1),
          new Part(Column.LATERAL_ACCELERATION, 1),
          new Part(Column.YAW_RATE, 1),
          new Part(Column.TIME, 1));
    }
  }

  /** Returns the error for a column whose sign is not that of ISO 8855. */
  InvalidInput opposite(Column column, String finding) {
    MappedColumn used = used(column).orElseThrow();
    return InvalidInput.of(
            "sign of the column " + used.header(),
            "positive to the right",
            "positive to the left (" + finding + ")",
            "write "
                + column.key()
                + "=-"
                + Header.of(used.header()).title()
                + "["
                + used.unit().symbol()
                + "] in the column mapping")
        .at(table.headerPlace());
  }

  private static double[] times(double[] a, double[] b) {
    double[] product = new double[a.length];
    for (int i = 0; i < a.length; i++) {
      product[i] = a[i] * b[i];
    }
    return product;
  }

  /** Geometric mean of the two regressions, so that noise in either does not pull it down. */
  private static double slope(double[] x, double[] y) {
    double xx = 0;
    double yy = 0;
    double xy = 0;
    for (int i = 0; i < x.length; i++) {
      xx += x[i] * x[i];
      yy += y[i] * y[i];
      xy += x[i] * y[i];
    }
    return Math.signum(xy) * Math.sqrt(yy / xx);
  }

  private static String text(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }
}
