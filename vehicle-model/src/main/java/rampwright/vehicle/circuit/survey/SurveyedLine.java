package rampwright.vehicle.circuit.survey;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import rampwright.vehicle.input.InvalidInput;

/**
 * The line of points in a plane: a cubic spline through them, its direction over its arc length.
 * The curvature comes from that direction with the smoothing of {@link TrackCircuit}.
 */
final class SurveyedLine {
  private static final int FEWEST = 8;

  /** A step of so many usual ones and so many metres is a hole in the line. */
  private static final double HOLE_RATIO = 20;

  private static final double HOLE = 100;

  /** Change of direction between two chords of at least 5 m (deg) that no car follows. */
  private static final double SHARPEST = 150;

  private static final double SHORTEST_CHORD = 5;

  /** How near a line must come back to its start to be cut there (m). */
  private static final double NEAR_START = 20;

  private static final double LAST_PART = 0.7;
  private static final double SCATTER_STEPS = 4;

  private final ImportOptions options;
  private final ImportReport.Draft report;

  private SurveyedLine(ImportOptions options, ImportReport.Draft report) {
    this.options = options;
    this.report = report;
  }

  static Track of(LinePoints points, ImportOptions options, ImportReport.Draft report) {
    return new SurveyedLine(options, report).track(points);
  }

  private Track track(LinePoints all) {
    double least = options.spacing() / 2;
    LinePoints points = all.thinned(least);
    report.set(Figure.POINTS, all.size());
    report.set(Figure.REPEATED, all.size() - points.size());
    checkEnough(points);
    if (options.closed()) {
      cutAtStart(points, least);
      checkEnough(points);
    }
    check(points);
    if (options.closed()) {
      checkClosed(points);
      points.add(points.get(0));
    }
    adviseSmoothing(points);
    ArcSpline spline = ArcSpline.of(points, options.closed());
    report.set(Figure.LENGTH_OF_CHORDS, Arrays.stream(points.chords()).sum());
    report.set(Figure.LENGTH_OF_CURVE, spline.length());
    report.note("The line is a cubic spline through the points.");
    return new Track(
        spline.heading(),
        spline.length(),
        Track.Offset.NONE,
        Optional.empty(),
        Optional.of(fixes(points, spline)),
        elevation(points, spline));
  }

  /** The scatter of points shows most in waves of two steps and hardly in waves of four. */
  private void adviseSmoothing(LinePoints points) {
    double step = LogSamples.median(points.chords());
    if (options.smoothing() < SCATTER_STEPS * step) {
      report.warn(
          String.format(
              Locale.ROOT,
              "The points lie about %.1f m apart: a smoothing length of %.0f m or more keeps their"
                  + " scatter out of the curvature.",
              step,
              Math.ceil(SCATTER_STEPS * step)));
    }
  }

  private void checkEnough(LinePoints points) {
    if (points.size() < FEWEST) {
      throw InvalidInput.of(
              "number of points at least " + options.spacing() / 2 + " m apart",
              Integer.toString(points.size()),
              "at least " + FEWEST,
              "the positions are in another unit")
          .at(report.file());
    }
  }

  /** Drops what was recorded after the line came back to its start. */
  private void cutAtStart(LinePoints points, double least) {
    int nearest = points.size() - 1;
    for (int i = (int) (LAST_PART * points.size()); i < points.size(); i++) {
      boolean nearer =
          points.get(i).apart(points.get(0)) < points.get(nearest).apart(points.get(0));
      nearest = nearer ? i : nearest;
    }
    if (points.get(nearest).apart(points.get(0)) > NEAR_START) {
      return;
    }
    int before = points.size();
    while (points.size() > nearest + 1) {
      points.removeLast();
    }
    while (points.size() > FEWEST && ahead(points) > -least) {
      points.removeLast();
    }
    // one point less is only the first one given again
    if (before - points.size() > 1) {
      report.note(
          before - points.size() + " points after the line had come back to its start were cut.");
    }
  }

  /** Returns how far the last point lies past the first (m), along the first chord. */
  private static double ahead(LinePoints points) {
    LinePoints.Point first = points.get(0);
    LinePoints.Point second = points.get(1);
    LinePoints.Point last = points.last();
    if (last.apart(first) > NEAR_START) {
      return Double.NEGATIVE_INFINITY;
    }
    return ((last.x() - first.x()) * (second.x() - first.x())
            + (last.y() - first.y()) * (second.y() - first.y()))
        / first.apart(second);
  }

  private void check(LinePoints points) {
    double[] chords = points.chords();
    double most = Math.max(HOLE, HOLE_RATIO * LogSamples.median(chords));
    for (int i = 0; i < chords.length; i++) {
      if (chords[i] > most) {
        throw InvalidInput.value(
                "distance from the point before",
                chords[i],
                "m",
                String.format(Locale.ROOT, "at most %.0f m", most),
                "the receiver lost its place, or points are missing")
            .at(points.get(i + 1).place());
      }
      if (i > 0 && Math.min(chords[i - 1], chords[i]) > SHORTEST_CHORD) {
        checkTurn(points, i);
      }
    }
  }

  private static void checkTurn(LinePoints points, int i) {
    LinePoints.Point a = points.get(i - 1);
    LinePoints.Point b = points.get(i);
    LinePoints.Point c = points.get(i + 1);
    double along = (b.x() - a.x()) * (c.x() - b.x()) + (b.y() - a.y()) * (c.y() - b.y());
    double across = (b.x() - a.x()) * (c.y() - b.y()) - (b.y() - a.y()) * (c.x() - b.x());
    double turn = Math.toDegrees(Math.abs(Math.atan2(across, along)));
    if (turn > SHARPEST) {
      throw InvalidInput.value(
              "change of direction at this point",
              Math.rint(turn),
              "deg",
              "at most " + Math.round(SHARPEST) + " deg",
              "the point is out of place, or the line is not in the order of driving")
          .at(b.place());
    }
  }

  private void checkClosed(LinePoints points) {
    double gap = points.last().apart(points.get(0));
    double longest = Arrays.stream(points.chords()).max().orElseThrow();
    double most = Math.max(3 * longest, NEAR_START);
    if (gap > most) {
      throw InvalidInput.value(
              "gap between the last point and the first",
              Math.rint(gap),
              "m",
              String.format(Locale.ROOT, "at most %.0f m", most),
              "the file does not hold one whole lap; an open run is imported as not closed")
          .at(report.file());
    }
  }

  private static Track.Fixes fixes(LinePoints points, ArcSpline spline) {
    int n = points.size();
    double[] s = new double[n];
    double[] x = new double[n];
    double[] y = new double[n];
    for (int i = 0; i < n; i++) {
      s[i] = spline.distance(i);
      x[i] = points.get(i).x();
      y[i] = points.get(i).y();
    }
    return new Track.Fixes(Curve.of(s, x), Curve.of(s, y));
  }

  private static Optional<Curve> elevation(LinePoints points, ArcSpline spline) {
    Series at = new Series();
    Series height = new Series();
    for (int i = 0; i < points.size(); i++) {
      if (!Double.isNaN(points.get(i).height())) {
        at.add(spline.distance(i));
        height.add(points.get(i).height());
      }
    }
    return at.size() < FEWEST
        ? Optional.empty()
        : Optional.of(Curve.of(at.toArray(), height.toArray()));
  }
}
