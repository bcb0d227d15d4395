package rampwright.vehicle.circuit.survey;

import java.util.Locale;
import rampwright.vehicle.circuit.CurvatureLine;
import rampwright.vehicle.input.InvalidInput;

/**
 * Joins the end of a lap to its start: first by the offset of the sensor that gives whole turns,
 * then by the smallest change of curvature that brings the end to the start ({@link
 * CurvatureLine#closedUp}). Both are reported.
 */
final class LapClosing {
  /** How far the turning of a lap may be from whole turns (turns). */
  private static final double TURN_SLACK = 0.2;

  /** How far the end may be from the start, by the lap's length, before it is closed. */
  private static final double GAP_SLACK = 0.08;

  private static final double GAP_CAUTION = 0.03;

  private final Track track;
  private final ImportReport.Draft report;

  LapClosing(Track track, ImportReport.Draft report) {
    this.track = track;
    this.report = report;
  }

  /**
   * Closes a line.
   *
   * @throws InvalidInput when it turns too little or too much, or ends too far from its start
   */
  CurvatureLine closed(CurvatureLine line) {
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
    report.set(Figure.CLOSING_CHANGE, TrackCircuit.rms(curvature(line), curvature(joined)));
    return joined;
  }

  /** Spreads missing turning as a constant offset of the sensor would have taken it away. */
  private CurvatureLine withoutOffset(CurvatureLine line, double missing) {
    if (track.offset() == Track.Offset.NONE || track.speed().isEmpty()) {
      return line;
    }
    boolean lateral = track.offset() == Track.Offset.LATERAL_ACCELERATION;
    double[] weight = new double[line.size()];
    double sum = 0;
    for (int i = 0; i < line.size(); i++) {
      double speed = track.speed().get().within(i * line.spacing());
      weight[i] = lateral ? 1 / (speed * speed) : 1 / speed;
      sum += weight[i] * line.spacing();
    }
    double[] curvature = curvature(line);
    for (int i = 0; i < line.size(); i++) {
      curvature[i] += missing / sum * weight[i];
    }
    report.set(lateral ? Figure.LATERAL_OFFSET : Figure.YAW_RATE_OFFSET, -missing / sum);
    return CurvatureLine.of(line.closed(), line.spacing(), curvature);
  }

  private static double[] curvature(CurvatureLine line) {
    double[] curvature = new double[line.size()];
    for (int i = 0; i < curvature.length; i++) {
      curvature[i] = line.curvature(i);
    }
    return curvature;
  }
}
