package rampwright.vehicle.circuit;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import org.apache.commons.math3.linear.SingularValueDecomposition;
import rampwright.vehicle.circuit.Segment.Straight;
import rampwright.vehicle.input.InvalidInput;

/** Circuits from a list of straights and corners. */
public final class SegmentLine {
  /** Step of the integration within a spacing (m). */
  private static final double STEP = 0.25;

  /** Gap of the straights (m) that is small enough to be closed by the curvature instead. */
  private static final double LARGEST_GAP = 0.05;

  private SegmentLine() {}

  /**
   * Returns an open run along the segments.
   *
   * @param name its name
   * @param segments in the order of driving
   * @param wantedSpacing distance between stations (m); rounded so that a whole number fits
   */
  public static Circuit open(String name, List<Segment> segments, double wantedSpacing) {
    double length = length(segments);
    int intervals = Math.max(4, (int) Math.round(length / wantedSpacing));
    double[] curvature = sampled(segments, length / intervals, intervals + 1);
    return CurvatureLine.of(false, length / intervals, curvature).circuit(name, Pose.ORIGIN);
  }

  /**
   * Returns a closed circuit along the segments. The corners are kept; the straights are lengthened
   * or shortened so that the end joins the start and the lap has the wanted length, with the least
   * sum of squared relative changes.
   *
   * @param name its name
   * @param segments in the order of driving; their angles add up to one turn, or to none for a
   *     figure of eight
   * @param length length of the lap (m)
   * @param wantedSpacing distance between stations (m); rounded so that a whole number fits
   * @throws InvalidInput when the angles do not add up or a straight would become negative
   */
  public static Circuit closed(
      String name, List<Segment> segments, double length, double wantedSpacing) {
    double turns = segments.stream().mapToDouble(Segment::turning).sum() / (2 * Math.PI);
    if (Math.abs(turns - Math.rint(turns)) > 1e-9 || Math.abs(turns) > 1 + 1e-9) {
      throw InvalidInput.value(
          "sum of the corner angles", 360 * turns, "deg", "360, 0 or -360 deg", "");
    }
    List<Segment> joined = joined(segments, length);
    int stations = Math.max(5, (int) Math.round(length / wantedSpacing));
    double spacing = length / stations;
    return CurvatureLine.of(true, spacing, sampled(joined, spacing, stations))
        .closedUp((int) Math.rint(turns))
        .circuit(name, Pose.ORIGIN);
  }

  private static double length(List<Segment> segments) {
    return segments.stream().mapToDouble(Segment::length).sum();
  }

  private static double[] sampled(List<Segment> segments, double spacing, int stations) {
    double[] curvature = new double[stations];
    int segment = 0;
    double start = 0;
    for (int i = 0; i < stations; i++) {
      double s = i * spacing;
      while (segment < segments.size() - 1 && s > start + segments.get(segment).length()) {
        start += segments.get(segment).length();
        segment++;
      }
      curvature[i] = curvature(segments.get(segment), s - start);
    }
    return curvature;
  }

  private static double curvature(Segment segment, double s) {
    return segment instanceof Segment.Corner corner ? corner.curvature(s) : 0;
  }

  /** The directions of the straights do not change, so the end point is linear in their lengths. */
  private static List<Segment> joined(List<Segment> segments, double length) {
    List<Integer> straights = new ArrayList<>();
    List<double[]> effects = new ArrayList<>();
    Pose end = Pose.ORIGIN;
    for (int i = 0; i < segments.size(); i++) {
      Segment segment = segments.get(i);
      if (segment instanceof Straight straight) {
        straights.add(i);
        effects.add(
            new double[] {
              straight.length() * Math.cos(end.heading()),
              straight.length() * Math.sin(end.heading()),
              straight.length()
            });
      }
      int steps = Math.max(1, (int) Math.ceil(segment.length() / STEP));
      double[] curvature = sampled(List.of(segment), segment.length() / steps, steps + 1);
      CurvatureLine line = CurvatureLine.of(false, segment.length() / steps, curvature);
      end = line.end().in(end);
    }
    RealMatrix effect = MatrixUtils.createRealMatrix(effects.toArray(double[][]::new)).transpose();
    RealVector missing =
        MatrixUtils.createRealVector(new double[] {-end.x(), -end.y(), length - length(segments)});
    double[] change = new SingularValueDecomposition(effect).getSolver().solve(missing).toArray();
    double left = missing.subtract(effect.operate(MatrixUtils.createRealVector(change))).getNorm();
    if (left > LARGEST_GAP) {
      throw InvalidInput.value(
          "gap that no lengths of the straights close",
          left,
          "m",
          "below " + LARGEST_GAP + " m",
          "another length of the lap fits, or a straight in another direction is needed");
    }
    List<Segment> joined = new ArrayList<>(segments);
    for (int k = 0; k < change.length; k++) {
      int i = straights.get(k);
      joined.set(i, new Straight(segments.get(i).length() * (1 + change[k])));
    }
    return joined;
  }
}
