package rampwright.vehicle.circuit;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;
import rampwright.vehicle.input.InvalidInput;

/**
 * A line given by its curvature at even spacing. Direction and position follow by integration, with
 * the curvature linear between stations.
 *
 * <p>The line starts at the origin along the x axis. A closed line has as many intervals as
 * stations, an open one has one fewer.
 */
public final class CurvatureLine {
  private static final int MOST_STEPS = 30;

  private final boolean closed;
  private final double spacing;
  private final double[] curvature;
  private final Pose[] poses;

  private CurvatureLine(boolean closed, double spacing, double[] curvature) {
    this.closed = closed;
    this.spacing = spacing;
    this.curvature = curvature;
    this.poses = new Pose[curvature.length + (closed ? 1 : 0)];
    poses[0] = Pose.ORIGIN;
    for (int i = 1; i < poses.length; i++) {
      poses[i] = poses[i - 1].after(spacing, curvature[i - 1], curvature[i % curvature.length]);
    }
  }

  /**
   * Returns the line of a curvature.
   *
   * @param closed whether the last station is followed by the first
   * @param spacing distance between stations (m)
   * @param curvature at each station (1/m)
   */
  public static CurvatureLine of(boolean closed, double spacing, double[] curvature) {
    return new CurvatureLine(closed, spacing, curvature.clone());
  }

  /** Returns whether the last station is followed by the first. */
  public boolean closed() {
    return closed;
  }

  /** Returns the distance between stations (m). */
  public double spacing() {
    return spacing;
  }

  /** Returns the number of stations. */
  public int size() {
    return curvature.length;
  }

  /** Returns the length (m). */
  public double length() {
    return spacing * (poses.length - 1);
  }

  /** Returns the curvature at a station (1/m). */
  public double curvature(int i) {
    return curvature[i];
  }

  /** Returns the place of a station. */
  public Pose pose(int i) {
    return poses[i];
  }

  /** Returns where the line ends; for a closed line back at its first station. */
  public Pose end() {
    return poses[poses.length - 1];
  }

  /** Returns the whole change of direction (rad), positive to the left. */
  public double turning() {
    return end().heading();
  }

  /** Returns the distance between the end and the start (m). */
  public double gap() {
    return Math.hypot(end().x(), end().y());
  }

  /**
   * Returns the line whose end joins its start in position and direction, with the smallest change
   * of curvature (least squares over the length). That change is {@code a + b*x + c*y}: the
   * derivative of the end point by the curvature at a station is the lever arm between them.
   *
   * @param turns whole turns to the left, for example -1 for a lap driven clockwise
   * @throws InvalidInput when the line is too far from closed for that
   */
  public CurvatureLine closedUp(int turns) {
    CurvatureLine line = this;
    for (int step = 0; step < MOST_STEPS; step++) {
      double missing = 2 * Math.PI * turns - line.turning();
      if (Math.abs(missing) < 1e-13 && line.gap() < 1e-9) {
        return line;
      }
      line = line.improved(missing);
    }
    throw InvalidInput.value(
        "distance between the end and the start of the lap",
        gap(),
        "m",
        "small enough to be closed by a correction of the curvature",
        "the log does not hold one whole lap");
  }

  private CurvatureLine improved(double missingTurning) {
    double[][] normal = new double[3][3];
    double[] basis = new double[3];
    for (int i = 0; i < curvature.length; i++) {
      lever(i, basis);
      for (int row = 0; row < 3; row++) {
        for (int column = 0; column < 3; column++) {
          normal[row][column] += basis[row] * basis[column] * spacing;
        }
      }
    }
    RealMatrix matrix = MatrixUtils.createRealMatrix(normal);
    double[] missing = {missingTurning, -end().x(), -end().y()};
    double[] factor =
        new LUDecomposition(matrix).getSolver().solve(new ArrayRealVector(missing)).toArray();
    double[] better = curvature.clone();
    for (int i = 0; i < better.length; i++) {
      lever(i, basis);
      better[i] += factor[0] * basis[0] + factor[1] * basis[1] + factor[2] * basis[2];
    }
    return new CurvatureLine(closed, spacing, better);
  }

  /** Moves of end direction and end point per turning at a station. */
  private void lever(int i, double[] basis) {
    basis[0] = 1;
    basis[1] = poses[i].y() - end().y();
    basis[2] = end().x() - poses[i].x();
  }

  /**
   * Returns a flat circuit with even grip along this line.
   *
   * @param name its name
   * @param start where its first station lies
   */
  public Circuit circuit(String name, Pose start) {
    List<Station> stations = new ArrayList<>();
    for (int i = 0; i < curvature.length; i++) {
      Pose place = poses[i].in(start);
      stations.add(Station.flat(i * spacing, curvature[i], place.x(), place.y()));
    }
    return new Circuit(name, closed, length(), stations);
  }
}
