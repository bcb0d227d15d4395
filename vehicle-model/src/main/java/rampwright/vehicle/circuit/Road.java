package rampwright.vehicle.circuit;

import rampwright.vehicle.Conditions;

/**
 * A circuit sampled at even spacing, as the lap solver drives it. Columns are plain arrays of one
 * value per station, never handed out.
 *
 * <p>A closed road has its stations at {@code i * spacing}, {@code i = 0 .. size-1}, and station 0
 * follows the last one. An open road has its last station at {@code length}.
 */
public final class Road {
  private final boolean closed;
  private final double length;
  private final double spacing;
  private final double[] curvature;
  private final double[] curvatureGradient;
  private final double[] grade;
  private final double[] bank;
  private final double[] verticalCurvature;
  private final double[] gripLeft;
  private final double[] gripRight;
  private final double[] headwind;

  private Road(boolean closed, double length, int size) {
    this.closed = closed;
    this.length = length;
    this.spacing = length / (closed ? size : size - 1);
    this.curvature = new double[size];
    this.curvatureGradient = new double[size];
    this.grade = new double[size];
    this.bank = new double[size];
    this.verticalCurvature = new double[size];
    this.gripLeft = new double[size];
    this.gripRight = new double[size];
    this.headwind = new double[size];
  }

  /**
   * Samples a circuit. Between stations curvature, grade, bank and grip follow Akima splines with
   * continuous slope (periodic for a closed circuit), so the curvature gradient is continuous.
   *
   * @param circuit the line
   * @param conditions give the wind
   * @param wantedSpacing wanted distance between stations (m)
   */
  public static Road of(Circuit circuit, Conditions conditions, double wantedSpacing) {
    return RoadSampler.sample(circuit, conditions, wantedSpacing);
  }

  static Road blank(boolean closed, double length, int size) {
    return new Road(closed, length, size);
  }

  void set(
      int i,
      double curvature,
      double curvatureGradient,
      double grade,
      double bank,
      double verticalCurvature,
      double gripLeft,
      double gripRight,
      double headwind) {
    this.curvature[i] = curvature;
    this.curvatureGradient[i] = curvatureGradient;
    this.grade[i] = grade;
    this.bank[i] = bank;
    this.verticalCurvature[i] = verticalCurvature;
    this.gripLeft[i] = gripLeft;
    this.gripRight[i] = gripRight;
    this.headwind[i] = headwind;
  }

  /** Returns whether the last station is followed by the first. */
  public boolean closed() {
    return closed;
  }

  /** Returns the length of the lap or run (m). */
  public double length() {
    return length;
  }

  /** Returns the distance between stations (m). */
  public double spacing() {
    return spacing;
  }

  /** Returns the number of stations. */
  public int size() {
    return curvature.length;
  }

  /** Returns the path curvature (1/m). */
  public double curvature(int i) {
    return curvature[i];
  }

  /** Returns the change of curvature along the path (1/m²). */
  public double curvatureGradient(int i) {
    return curvatureGradient[i];
  }

  /** Returns the slope along the path (rad), positive uphill. */
  public double grade(int i) {
    return grade[i];
  }

  /** Returns the cross slope (rad), positive when it helps a left turn. */
  public double bank(int i) {
    return bank[i];
  }

  /** Returns the vertical curvature (1/m), positive in a dip. */
  public double verticalCurvature(int i) {
    return verticalCurvature[i];
  }

  /** Returns the grip factor of the left wheels (-). */
  public double gripLeft(int i) {
    return gripLeft[i];
  }

  /** Returns the grip factor of the right wheels (-). */
  public double gripRight(int i) {
    return gripRight[i];
  }

  /** Returns the wind against the path (m/s), negative from behind. */
  public double headwind(int i) {
    return headwind[i];
  }
}
