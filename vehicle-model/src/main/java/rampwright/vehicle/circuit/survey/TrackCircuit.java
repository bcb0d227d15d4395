package rampwright.vehicle.circuit.survey;

import java.util.Optional;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.CurvatureLine;
import rampwright.vehicle.circuit.Pose;
import rampwright.vehicle.input.InvalidInput;

/**
 * Makes a circuit of a track: mean curvature of even cells, zero-phase smoothing, closing, and the
 * place in the plane that fits the measured positions best.
 *
 * <p>The mean of a cell is the change of direction over it, so cells neither lose nor gain turning
 * and no wave shorter than a cell is folded into a longer one.
 */
final class TrackCircuit {
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
    return options.closed() ? new LapClosing(track, report).closed(line) : line;
  }

  private ImportedCircuit circuit(String name) {
    double[] raw = cells();
    double[] smooth = Smoothing.smooth(raw, options.closed(), spacing, options.smoothing());
    report.set(Figure.SMOOTHING_LENGTH, options.smoothing());
    report.set(Figure.SMOOTHING_CHANGE, rms(raw, smooth));
    CurvatureLine line = CurvatureLine.of(options.closed(), spacing, smooth);
    report.set(Figure.TURNING_BEFORE, Math.toDegrees(line.turning()));
    if (options.closed()) {
      line = new LapClosing(track, report).closed(line);
    }
    Pose start = place(line);
    Circuit flat = line.circuit(name, start);
    Circuit circuit =
        track.elevation().map(h -> HeightGrade.on(flat, h, options, report)).orElse(flat);
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

  static double rms(double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += (a[i] - b[i]) * (a[i] - b[i]);
    }
    return Math.sqrt(sum / a.length);
  }
}
