package rampwright.vehicle.circuit.survey;

import java.util.Locale;
import java.util.Optional;
import java.util.function.DoubleFunction;
import rampwright.vehicle.input.InvalidInput;

/** Positions of a log or of a list of points, in a plane. */
final class Positions {
  /** Chords of this length (m) neither follow the scatter of positions nor cut corners much. */
  private static final double CHORD = 10;

  private static final double LONGEST_PAUSE = 1;

  /** A step is a jump when it is so many times the way by speed, plus a slack (m). */
  private static final double JUMP = 1.5;

  private static final double LEAP_SLACK = 15;

  /** As {@link #JUMP} while the unit of speed may still be wrong: km/h for m/s is 3.6 times. */
  private static final double LEAP = 4.5;

  private Positions() {}

  /**
   * Returns the positions of a table in the plane (m), NaN where there is none; empty when the file
   * has no position columns.
   */
  static Optional<Curve> of(CsvTable table, ImportReport.Draft report) {
    if (table.has(Column.X) && table.has(Column.Y)) {
      return Optional.of(Curve.of(table.get(Column.X).toArray(), table.get(Column.Y).toArray()));
    }
    if (table.has(Column.LATITUDE) && table.has(Column.LONGITUDE)) {
      return Optional.of(
          projected(
              table.get(Column.LATITUDE).toArray(), table.get(Column.LONGITUDE).toArray(), report));
    }
    return Optional.empty();
  }

  /**
   * Returns geographic positions in the plane through the first of them.
   *
   * @param latitude (rad), NaN where there is none
   * @param longitude (rad), NaN where there is none
   */
  static Curve projected(double[] latitude, double[] longitude, ImportReport.Draft report) {
    double[] x = new double[latitude.length];
    double[] y = new double[latitude.length];
    LocalFrame frame = null;
    for (int i = 0; i < x.length; i++) {
      boolean known = !Double.isNaN(latitude[i]) && !Double.isNaN(longitude[i]);
      if (known && frame == null) {
        frame = new LocalFrame(latitude[i], longitude[i], 0);
        report.note(origin(latitude[i], longitude[i]));
      }
      LocalFrame.Geocentric place = LocalFrame.geocentric(latitude[i], longitude[i], 0);
      x[i] = known ? frame.east(place) : Double.NaN;
      y[i] = known ? frame.north(place) : Double.NaN;
    }
    return Curve.of(x, y);
  }

  private static String origin(double latitude, double longitude) {
    return String.format(
        Locale.ROOT,
        "Positions are metres east and north of latitude %.7f°, longitude %.7f° (WGS 84).",
        Math.toDegrees(latitude),
        Math.toDegrees(longitude));
  }

  /**
   * Returns the fixes of a lap: positions that are there and are not those of the sample before.
   *
   * @param positions of every row of the file
   * @param distance of every sample (m)
   */
  static Optional<Track.Fixes> fixes(Curve positions, LogSamples samples, double[] distance) {
    Series places = new Series();
    Series east = new Series();
    Series north = new Series();
    for (int i = 0; i < samples.size(); i++) {
      double x = samples.value(positions::x, i);
      double y = samples.value(positions::y, i);
      int last = east.size() - 1;
      boolean held = last >= 0 && east.get(last) == x && north.get(last) == y;
      if (!Double.isNaN(x) && !Double.isNaN(y) && !held) {
        places.add(distance[i]);
        east.add(x);
        north.add(y);
      }
    }
    if (places.size() < 2) {
      return Optional.empty();
    }
    double[] at = places.toArray();
    return Optional.of(
        new Track.Fixes(Curve.of(at, east.toArray()), Curve.of(at, north.toArray())));
  }

  /** Returns the length of the way between fixes by speed (m), then by position (m). */
  static double[] lengths(Track.Fixes fixes, double usualSpeed) {
    double bySpeed = 0;
    double byPosition = 0;
    int anchor = 0;
    boolean broken = false;
    for (int i = 1; i < fixes.size(); i++) {
      double way = fixes.distance(i) - fixes.distance(i - 1);
      broken |= way > LONGEST_PAUSE * usualSpeed;
      double chord = apart(fixes, anchor, i);
      broken |= apart(fixes, i - 1, i) > LEAP * way + LEAP_SLACK;
      if (chord >= CHORD) {
        if (!broken) {
          bySpeed += fixes.distance(i) - fixes.distance(anchor);
          byPosition += chord;
        }
        anchor = i;
        broken = false;
      }
    }
    return new double[] {bySpeed, byPosition};
  }

  /**
   * Checks that no fix lies far off the way from the one before.
   *
   * @param place where in the file the sample of a distance stands
   */
  static void checkJumps(Track.Fixes fixes, DoubleFunction<String> place) {
    for (int i = 1; i < fixes.size(); i++) {
      double way = fixes.distance(i) - fixes.distance(i - 1);
      double chord = apart(fixes, i - 1, i);
      if (chord > JUMP * way + LEAP_SLACK) {
        throw InvalidInput.value(
                "step of the position",
                chord,
                "m",
                String.format(Locale.ROOT, "about the %.1f m driven meanwhile by speed", way),
                "the receiver lost its place: leave those cells empty")
            .at(place.apply(fixes.distance(i)));
      }
    }
  }

  private static double apart(Track.Fixes fixes, int i, int k) {
    return Math.hypot(
        fixes.east().y(k) - fixes.east().y(i), fixes.north().y(k) - fixes.north().y(i));
  }

  /**
   * Returns how much of the way is missing between the last fix and the first (m), along the
   * direction of the start; negative when the lap goes on past its start.
   */
  static double missing(Track.Fixes fixes) {
    int ahead = 1;
    while (ahead < fixes.size() - 1 && apart(fixes, 0, ahead) < CHORD) {
      ahead++;
    }
    double chord = apart(fixes, 0, ahead);
    int last = fixes.size() - 1;
    double eastward = fixes.east().y(0) - fixes.east().y(last);
    double northward = fixes.north().y(0) - fixes.north().y(last);
    return (eastward * (fixes.east().y(ahead) - fixes.east().y(0))
            + northward * (fixes.north().y(ahead) - fixes.north().y(0)))
        / chord;
  }
}
