package rampwright.vehicle.circuit.survey;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.CurvatureLine;
import rampwright.vehicle.circuit.Pose;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.input.InvalidInput;

/**
 * Makes a circuit of a track: mean curvature of even cells, zero-phase smoothing, closing, and the
 * place in the plane that fits the measured positions best.
 *
 * <p>The mean of a cell is the change of direction over it, so cells neither lose nor gain turning
 * and no wave shorter than a cell is folded into a longer one. Closing first takes the offset of
 * the sensor that gives whole turns, then the smallest change of curvature that joins the ends
 * ({@link CurvatureLine#closedUp}).
 */
final class TrackCircuit {
  /** How far the turning of a lap may be from whole turns (turns). */
  private static final double TURN_SLACK = 0.2;

  /** How far the end may be from the start, by the lap's length, before it is closed. */
  private static final double GAP_SLACK = 0.08;

  private static final double GAP_CAUTION = 0.03;

  /**
   * Heights are smoothed over at least this length (m): a satellite receiver is vague in height.
   */
  private static final double HEIGHT_SMOOTHING = 80;

  /** Largest difference between distance and positions that is put right. */
  private static final double LARGEST_CORRECTION = 0.05;

  private static final int FEWEST_FIXES = 20;

  /** Share of the length that positions must cover before they give the scale. */
  private static final double COVER = 0.8;

  private final ImportReport.Draft report;
  private final ImportOptions options;
  private final Track track;
  private final int stations;
  private final double spacing;

  private TrackCircuit(ImportReport.Draft report, ImportOptions options, Track track) {
    this.report = report;
    this.options = options;
    this.track = track;
    int intervals = Math.max(5, (int) Math.round(track.length() / options.spacing()));
    this.stations = options.closed() ? intervals : intervals + 1;
    this.spacing = track.length() / intervals;
  }

  static ImportedCircuit of(
      String name, Track track, ImportOptions options, ImportReport.Draft report) {
    Track scaled = scaled(track, options, report);
    return new TrackCircuit(report, options, scaled).circuit(name);
  }

  /**
   * Lengthens or shortens a track to the size of its positions: the distance of wheel speeds is off
   * with the rolling radius, that of a line through scattered points is too long.
   */
  private static Track scaled(Track track, ImportOptions options, ImportReport.Draft report) {
    if (track.fixes().isEmpty() || !covers(track.fixes().get(), track.length())) {
      return track;
    }
    ImportReport.Draft unread = new ImportReport.Draft(report.file(), "");
    CurvatureLine line = new TrackCircuit(unread, options, track).line();
    double scale = fit(line, track.fixes().get()).scale();
    if (!(Math.abs(scale - 1) <= LARGEST_CORRECTION)) {
      throw InvalidInput.value(
              "size of the line by its positions over that by its distance",
              scale,
              "",
              "within " + Math.round(100 * LARGEST_CORRECTION) + " % of 1",
              "the positions belong to another lap, or a unit is wrong")
          .at(report.file());
    }
    report.set(Figure.DISTANCE_CORRECTION, 100 * (scale - 1));
    report.set(Figure.LENGTH_BY_POSITION, scale * track.length());
    return track.scaled(scale);
  }

  private static boolean covers(Track.Fixes fixes, double length) {
    int last = fixes.size() - 1;
    return last >= FEWEST_FIXES && fixes.distance(last) - fixes.distance(0) > COVER * length;
  }

  private CurvatureLine line() {
    double[] smooth = Smoothing.smooth(cells(), options.closed(), spacing, options.smoothing());
    CurvatureLine line = CurvatureLine.of(options.closed(), spacing, smooth);
    return options.closed() ? closed(line) : line;
  }

  private ImportedCircuit circuit(String name) {
    double[] raw = cells();
    double[] smooth = Smoothing.smooth(raw, options.closed(), spacing, options.smoothing());
    report.set(Figure.SMOOTHING_LENGTH, options.smoothing());
    report.set(Figure.SMOOTHING_CHANGE, rms(raw, smooth));
    CurvatureLine line = CurvatureLine.of(options.closed(), spacing, smooth);
    report.set(Figure.TURNING_BEFORE, Math.toDegrees(line.turning()));
    if (options.closed()) {
      line = closed(line);
    }
    Pose start = place(line);
    Circuit circuit = withGrade(line.circuit(name, start));
    reportResult(circuit);
    Curve curvature = Curve.even(stations, spacing, s -> raw[(int) Math.round(s / spacing)]);
    Optional<Curve> positions = track.fixes().map(Track.Fixes::points);
    return new ImportedCircuit(
        circuit, report.report(), new ImportCurves(curvature, track.speed(), positions));
  }

  private double[] cells() {
    double[] curvature = new double[stations];
    for (int i = 0; i < stations; i++) {
      double from = (i - 0.5) * spacing;
      double to = (i + 0.5) * spacing;
      if (!options.closed()) {
        from = Math.max(0, from);
        to = Math.min(track.length(), to);
      }
      curvature[i] =
          (track.heading(to, options.closed()) - track.heading(from, options.closed()))
              / (to - from);
    }
    return curvature;
  }

  private CurvatureLine closed(CurvatureLine line) {
    double turns = line.turning() / (2 * Math.PI);
    int whole = (int) Math.rint(Math.max(-1, Math.min(1, turns)));
    if (!(Math.abs(turns - whole) <= TURN_SLACK)) {
      throw InvalidInput.value(
              "whole turning of the lap",
              Math.rint(3600 * turns) / 10,
              "deg",
              "within " + Math.round(360 * TURN_SLACK) + " deg of -360, 0 or 360 deg",
              "the file does not hold exactly one whole lap, or a unit is wrong")
          .at(report.file());
    }
    report.set(Figure.GAP_BEFORE, line.gap());
    CurvatureLine centred = withoutOffset(line, 2 * Math.PI * whole - line.turning());
    double most = GAP_SLACK * track.length();
    if (centred.gap() > most) {
      throw InvalidInput.value(
              "gap between the end and the start of the lap",
              Math.rint(centred.gap()),
              "m",
              String.format(Locale.ROOT, "at most %.0f m", most),
              "the file does not hold one whole lap; an open run is imported as not closed")
          .at(report.file());
    }
    if (centred.gap() > GAP_CAUTION * track.length()) {
      report.warn(
          String.format(
              Locale.ROOT,
              "Before closing, the end of the lap lay %.0f m from its start: compare the map with"
                  + " the circuit's.",
              centred.gap()));
    }
    CurvatureLine joined = centred.closedUp(whole);
    report.set(Figure.TURNING_AFTER, Math.toDegrees(joined.turning()));
    report.set(Figure.GAP_AFTER, joined.gap());
    report.set(Figure.CLOSING_CHANGE, rms(curvature(line), curvature(joined)));
    return joined;
  }

  /** Spreads missing turning as a constant offset of the sensor would have taken it away. */
  private CurvatureLine withoutOffset(CurvatureLine line, double missing) {
    if (track.offset() == Track.Offset.NONE || track.speed().isEmpty()) {
      return line;
    }
    boolean lateral = track.offset() == Track.Offset.LATERAL_ACCELERATION;
    double[] weight = new double[stations];
    double sum = 0;
    for (int i = 0; i < stations; i++) {
      double speed = track.speed().get().within(i * spacing);
      weight[i] = lateral ? 1 / (speed * speed) : 1 / speed;
      sum += weight[i] * spacing;
    }
    double[] curvature = curvature(line);
    for (int i = 0; i < stations; i++) {
      curvature[i] += missing / sum * weight[i];
    }
    report.set(lateral ? Figure.LATERAL_OFFSET : Figure.YAW_RATE_OFFSET, -missing / sum);
    return CurvatureLine.of(line.closed(), spacing, curvature);
  }

  private static double[] curvature(CurvatureLine line) {
    double[] curvature = new double[line.size()];
    for (int i = 0; i < curvature.length; i++) {
      curvature[i] = line.curvature(i);
    }
    return curvature;
  }

  private Pose place(CurvatureLine line) {
    if (track.fixes().isEmpty()) {
      return Pose.ORIGIN;
    }
    Track.Fixes fixes = track.fixes().get();
    ShapeFit fit = fit(line, fixes);
    double sum = 0;
    double most = 0;
    for (int i = 0; i < fixes.size(); i++) {
      Pose pose = at(line, fixes.distance(i)).in(fit.frame());
      double apart = Math.hypot(pose.x() - fixes.east().y(i), pose.y() - fixes.north().y(i));
      sum += apart * apart;
      most = Math.max(most, apart);
    }
    report.set(Figure.FIXES, fixes.size());
    report.set(Figure.POSITION_DEVIATION, Math.sqrt(sum / fixes.size()));
    report.set(Figure.POSITION_DEVIATION_MOST, most);
    return fit.frame();
  }

  /** Lays a line on measured positions. */
  static ShapeFit fit(CurvatureLine line, Track.Fixes fixes) {
    double[] x = new double[fixes.size()];
    double[] y = new double[fixes.size()];
    for (int i = 0; i < x.length; i++) {
      Pose pose = at(line, fixes.distance(i));
      x[i] = pose.x();
      y[i] = pose.y();
    }
    return ShapeFit.of(Curve.of(x, y), fixes.points());
  }

  private static Pose at(CurvatureLine line, double distance) {
    double place = Math.max(0, Math.min(line.length(), distance));
    int i = Math.min((int) (place / line.spacing()), line.size() - 1);
    double along = place - i * line.spacing();
    double from = line.curvature(i);
    int after = line.closed() ? (i + 1) % line.size() : Math.min(i + 1, line.size() - 1);
    double next = line.curvature(after);
    double to = from + (next - from) * along / line.spacing();
    return line.pose(i).after(along, from, to);
  }

  private Circuit withGrade(Circuit flat) {
    if (track.elevation().isEmpty()) {
      return flat;
    }
    Curve height = track.elevation().get();
    // a lap ends at the height at which it began: what is left is drift of the sensor
    double drift =
        options.closed() ? (height.within(track.length()) - height.y(0)) / track.length() : 0;
    double[] even = new double[stations];
    for (int i = 0; i < stations; i++) {
      even[i] = height.within(i * spacing) - drift * i * spacing;
    }
    double length = Math.max(HEIGHT_SMOOTHING, options.smoothing());
    double[] smooth = Smoothing.smooth(even, options.closed(), spacing, length);
    List<Station> graded = new ArrayList<>();
    double lowest = smooth[0];
    double highest = smooth[0];
    for (int i = 0; i < stations; i++) {
      lowest = Math.min(lowest, smooth[i]);
      highest = Math.max(highest, smooth[i]);
      graded.add(withGrade(flat.stations().get(i), grade(smooth, i)));
    }
    report.set(Figure.CLIMB, highest - lowest);
    report.note(
        String.format(
            Locale.ROOT, "The grade comes from the heights, smoothed over %.0f m.", length));
    return new Circuit(flat.name(), flat.closed(), flat.length(), graded);
  }

  private double grade(double[] height, int i) {
    int before = options.closed() ? Math.floorMod(i - 1, stations) : Math.max(0, i - 1);
    int after = options.closed() ? (i + 1) % stations : Math.min(stations - 1, i + 1);
    int steps = options.closed() ? 2 : after - before;
    return Math.atan((height[after] - height[before]) / (steps * spacing));
  }

  private static Station withGrade(Station flat, double grade) {
    return new Station(flat.distance(), flat.curvature(), flat.x(), flat.y(), grade, 0, 1, 1);
  }

  private void reportResult(Circuit circuit) {
    double sharpest =
        circuit.stations().stream().mapToDouble(s -> Math.abs(s.curvature())).max().orElse(0);
    report.set(Figure.LENGTH, circuit.length());
    report.set(Figure.STATIONS, stations);
    report.set(Figure.SPACING, spacing);
    if (sharpest > 1e-6) {
      report.set(Figure.SMALLEST_RADIUS, 1 / sharpest);
    }
  }

  private static double rms(double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += (a[i] - b[i]) * (a[i] - b[i]);
    }
    return Math.sqrt(sum / a.length);
  }
}
