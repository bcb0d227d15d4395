package rampwright.vehicle.circuit.survey;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import rampwright.vehicle.input.InvalidInput;

/**
 * The line of a logged lap: distance by integrating speed over time, curvature as lateral
 * acceleration over speed squared or yaw rate over speed.
 *
 * <p>Assumptions: the lateral acceleration is that of the path (sideslip changes slowly, the car is
 * level across: a banked or rolling car shows part of gravity), and speed is that over ground.
 * Constant offsets are taken out when the lap is closed.
 */
final class LoggedLap {
  /** Below this speed (m/s) curvature is all noise. */
  private static final double SLOWEST = 3;

  /** Deviation of single values that is always let pass: speed (m/s), acceleration, yaw rate. */
  private static final double SPEED_FLOOR = 3;

  private static final double ACCELERATION_FLOOR = 10;
  private static final double YAW_RATE_FLOOR = 0.6;

  /** Acceleration (m/s²) that no car on wheels reaches along its path. */
  private static final double LARGEST_ACCELERATION = 60;

  private static final double SMALLEST_JUMP = 3;

  private final CsvTable table;
  private final ImportOptions options;
  private final ImportReport.Draft report;
  private final LogUnits units;

  private LoggedLap(CsvTable table, ImportOptions options, ImportReport.Draft report) {
    this.table = table;
    this.options = options;
    this.report = report;
    this.units = new LogUnits(table, report);
  }

  static Track read(CsvTable table, ImportOptions options, ImportReport.Draft report) {
    table.require(Column.TIME, Column.SPEED);
    if (!table.has(Column.YAW_RATE)) {
      table.require(Column.LATERAL_ACCELERATION);
    }
    return new LoggedLap(table, options, report).track();
  }

  private Track track() {
    LapRows lap = LapRows.of(table, options, report);
    LogSamples samples = LogSamples.of(table, lap, options, report);
    Dropouts dropouts = new Dropouts(samples, options);
    double[] speed = dropouts.repaired(Column.SPEED, SPEED_FLOOR);
    boolean lateral = table.has(Column.LATERAL_ACCELERATION);
    double[] turn =
        lateral
            ? dropouts.repaired(Column.LATERAL_ACCELERATION, ACCELERATION_FLOOR)
            : dropouts.repaired(Column.YAW_RATE, YAW_RATE_FLOOR);
    report.note(
        lateral
            ? "Curvature is lateral acceleration over speed squared."
            : "Curvature is yaw rate over speed.");
    checkTwice(samples, dropouts, speed, turn);
    dropouts.report(report);
    checkSpeed(samples, speed);
    double[] distance = new double[speed.length];
    double[] heading = new double[speed.length];
    for (int i = 1; i < speed.length; i++) {
      double time = samples.time(i) - samples.time(i - 1);
      distance[i] = distance[i - 1] + 0.5 * (speed[i] + speed[i - 1]) * time;
      double before = lateral ? turn[i - 1] / speed[i - 1] : turn[i - 1];
      double now = lateral ? turn[i] / speed[i] : turn[i];
      heading[i] = heading[i - 1] + 0.5 * (before + now) * time;
    }
    Optional<Track.Fixes> fixes = fixes(samples, distance);
    double length = length(lap, samples, distance, speed, fixes);
    Track track =
        new Track(
            Curve.of(distance, heading),
            length,
            lateral ? Track.Offset.LATERAL_ACCELERATION : Track.Offset.YAW_RATE,
            Optional.of(Curve.of(distance, speed)),
            fixes,
            elevation(samples, distance));
    if (options.closed()) {
      fixes.ifPresent(found -> checkSign(track, found, lateral));
      units.turning(track.turning(), track.absoluteTurning());
    }
    report.set(Figure.LENGTH_BY_SPEED, length);
    return track;
  }

  /** Compares what the file holds twice. */
  private void checkTwice(LogSamples samples, Dropouts dropouts, double[] speed, double[] turn) {
    if (table.has(Column.LATERAL_ACCELERATION) && table.has(Column.YAW_RATE)) {
      units.lateral(speed, turn, dropouts.repaired(Column.YAW_RATE, YAW_RATE_FLOOR));
    }
    if (table.has(Column.LONGITUDINAL_ACCELERATION)) {
      units.longitudinal(
          samples, speed, dropouts.repaired(Column.LONGITUDINAL_ACCELERATION, ACCELERATION_FLOOR));
    }
  }

  /** A lap that turns once goes round its positions in the same sense. */
  private void checkSign(Track track, Track.Fixes fixes, boolean lateral) {
    boolean once = Math.abs(Math.abs(track.turning()) - 2 * Math.PI) < 1;
    if (once && track.turning() * fixes.area() < 0) {
      throw units.opposite(
          lateral ? Column.LATERAL_ACCELERATION : Column.YAW_RATE,
          "by its positions the lap turns the other way");
    }
  }

  private void checkSpeed(LogSamples samples, double[] speed) {
    for (int i = 0; i < speed.length; i++) {
      if (speed[i] < SLOWEST) {
        throw InvalidInput.value(
                "speed",
                speed[i],
                "m/s",
                String.format(Locale.ROOT, "at least %.0f m/s all through the lap", SLOWEST),
                "the log holds a stop, or the speed is in another unit")
            .at(samples.place(i));
      }
      double step = i == 0 ? 0 : Math.abs(speed[i] - speed[i - 1]);
      double time = i == 0 ? 1 : samples.time(i) - samples.time(i - 1);
      if (step > SMALLEST_JUMP && step > LARGEST_ACCELERATION * time) {
        throw InvalidInput.value(
                "step of the speed",
                step,
                "m/s",
                String.format(Locale.ROOT, "at most %.0f m/s²", LARGEST_ACCELERATION)
                    + " over its interval",
                "two pieces of a log were joined here, or the sensor failed")
            .at(samples.place(i));
      }
    }
  }

  private Optional<Track.Fixes> fixes(LogSamples samples, double[] distance) {
    Optional<Track.Fixes> fixes =
        Positions.of(table, report).flatMap(p -> Positions.fixes(p, samples, distance));
    fixes.ifPresent(
        found -> {
          double time = samples.time(samples.size() - 1) - samples.time(0);
          double[] lengths = Positions.lengths(found, distance[distance.length - 1] / time);
          if (lengths[1] > 0.5 * distance[distance.length - 1]) {
            units.lengths(lengths[0], lengths[1]);
          }
          Positions.checkJumps(found, at -> samples.place(Arrays.binarySearch(distance, at)));
        });
    return fixes;
  }

  private double length(
      LapRows lap,
      LogSamples samples,
      double[] distance,
      double[] speed,
      Optional<Track.Fixes> fixes) {
    int last = distance.length - 1;
    double time = samples.time(last) - samples.time(0);
    if (!options.closed() || lap.joined()) {
      report.set(Figure.LAP_TIME, time);
      return distance[last];
    }
    double missing = speed[last] * samples.interval();
    if (fixes.isPresent()) {
      Track.Fixes found = fixes.get();
      double tail = distance[last] - found.distance(found.size() - 1);
      double head = found.distance(0);
      missing = Positions.missing(found) - tail - head;
      checkGap(found.gap(), distance[last]);
      report.note("The lap ends where the positions come back to its start.");
    } else {
      report.note("The lap is taken to end one sample after the last one.");
    }
    report.set(Figure.LAP_TIME, time + missing / speed[last]);
    return distance[last] + missing;
  }

  private void checkGap(double gap, double length) {
    double most = Math.max(30, 0.03 * length);
    if (gap > most) {
      throw InvalidInput.value(
              "gap between the last position and the first",
              Math.rint(gap),
              "m",
              String.format(Locale.ROOT, "at most %.0f m", most),
              "the file does not hold exactly one whole lap; an open run is imported as not closed")
          .at(table.file());
    }
  }

  private Optional<Curve> elevation(LogSamples samples, double[] distance) {
    if (!table.has(Column.ELEVATION)) {
      return Optional.empty();
    }
    double[] height = samples.values(Column.ELEVATION);
    Series at = new Series();
    Series known = new Series();
    for (int i = 0; i < height.length; i++) {
      if (!Double.isNaN(height[i])) {
        at.add(distance[i]);
        known.add(height[i]);
      }
    }
    return known.size() < 2
        ? Optional.empty()
        : Optional.of(Curve.of(at.toArray(), known.toArray()));
  }
}
