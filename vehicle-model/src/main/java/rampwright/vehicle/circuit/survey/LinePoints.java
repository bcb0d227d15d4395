package rampwright.vehicle.circuit.survey;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rampwright.vehicle.input.InvalidInput;

/** Points of a surveyed line in the order of driving, each with its place in the file. */
final class LinePoints {
  private final List<Point> points = new ArrayList<>();

  /**
   * A point.
   *
   * @param x position (m), or longitude (rad) before {@link #projected}
   * @param y position (m), or latitude (rad) before {@link #projected}
   * @param height (m), NaN where unknown
   * @param place where it stands in the file
   */
  record Point(double x, double y, double height, String place) {
    double apart(Point other) {
      return Math.hypot(other.x - x, other.y - y);
    }
  }

  /**
   * Points of a file with the name that it gives them.
   *
   * @param name empty when it gives none
   * @param points geographic
   */
  record Named(String name, LinePoints points) {}

  /** Reads the rows of a table; a row without position is left out. */
  static LinePoints of(CsvTable table, ImportReport.Draft report) {
    Optional<Curve> positions = Positions.of(table, report);
    if (positions.isEmpty()) {
      table.require(Column.X, Column.Y);
    }
    Curve places = positions.orElseThrow();
    LinePoints points = new LinePoints();
    int missing = 0;
    for (int row = 0; row < table.rows(); row++) {
      double height =
          table.has(Column.ELEVATION) ? table.get(Column.ELEVATION).get(row) : Double.NaN;
      if (Double.isNaN(places.x(row)) != Double.isNaN(places.y(row))) {
        throw InvalidInput.of("position", "NaN", "given in both columns or in none", "")
            .at(table.place(row));
      }
      if (Double.isNaN(places.x(row))) {
        missing++;
      } else {
        points.add(new Point(places.x(row), places.y(row), height, table.place(row)));
      }
    }
    if (missing > 0) {
      report.note(missing + " rows without a position were left out.");
    }
    return points;
  }

  /**
   * Checks and adds a geographic point.
   *
   * @param longitude (deg)
   * @param latitude (deg)
   * @param height (m), NaN where unknown
   */
  void addGeographic(double longitude, double latitude, double height, String place) {
    double x = Math.toRadians(longitude);
    double y = Math.toRadians(latitude);
    try {
      Column.LONGITUDE.quantity().check(x);
      Column.LATITUDE.quantity().check(y);
      if (!Double.isNaN(height)) {
        Column.ELEVATION.quantity().check(height);
      }
    } catch (InvalidInput e) {
      throw e.at(place);
    }
    add(new Point(x, y, height, place));
  }

  void add(Point point) {
    points.add(point);
  }

  int size() {
    return points.size();
  }

  Point get(int i) {
    return points.get(i);
  }

  Point last() {
    return points.get(points.size() - 1);
  }

  void removeLast() {
    points.remove(points.size() - 1);
  }

  /** Returns geographic points in the plane through the first of them. */
  LinePoints projected(ImportReport.Draft report) {
    double[] latitude = points.stream().mapToDouble(Point::y).toArray();
    double[] longitude = points.stream().mapToDouble(Point::x).toArray();
    Curve plane = Positions.projected(latitude, longitude, report);
    LinePoints projected = new LinePoints();
    for (int i = 0; i < size(); i++) {
      Point point = points.get(i);
      projected.add(new Point(plane.x(i), plane.y(i), point.height, point.place));
    }
    return projected;
  }

  /** Returns the points that lie at least {@code least} (m) from the one kept before. */
  LinePoints thinned(double least) {
    LinePoints kept = new LinePoints();
    for (Point point : points) {
      if (kept.size() == 0 || point.apart(kept.last()) >= least) {
        kept.add(point);
      }
    }
    return kept;
  }

  /** Returns the distances between neighbours (m). */
  double[] chords() {
    double[] chords = new double[size() - 1];
    for (int i = 0; i < chords.length; i++) {
      chords[i] = points.get(i).apart(points.get(i + 1));
    }
    return chords;
  }
}
