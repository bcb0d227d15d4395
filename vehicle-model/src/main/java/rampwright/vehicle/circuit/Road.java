package rampwright.vehicle.circuit;

import rampwright.vehicle.Conditions;

/**
 * A circuit sampled for the lap solver: at even spacing, or in tight corners at points between the
 * even stations as well. Columns are plain arrays of one value per point, never handed out.
 *
 * <p>A closed road has its even stations at {@code i * spacing}, and point 0 follows the last one.
 * An open road has its last point at {@code length}.
 */
public final class Road {
  private final boolean closed;
  private final double length;
  private final double spacing;
  private final double[] distance;
  private final int[] pointOfStation;
  private final double[] curvature;
  private final double[] curvatureGradient;
  private final double[] grade;
  private final double[] bank;
  private final double[] verticalCurvature;
  private final double[] gripLeft;
  private final double[] gripRight;
  private final double[] headwind;

  private Road(
      boolean closed, double length, double spacing, double[] distance, int[] pointOfStation) {
    int size = distance.length;
    this.closed = closed;
    this.length = length;
    this.spacing = spacing;
    this.distance = distance;
    this.pointOfStation = pointOfStation;
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
    return new RoadSampler(circuit, conditions).even(wantedSpacing);
  }

  /**
   * Samples a circuit like {@link #of}, with further points between the stations where the road is
   * so tight that the car's state changes much within the wanted spacing: in and near corners
   * points lie no further apart than a fixed share of the radius.
   */
  public static Road refined(Circuit circuit, Conditions conditions, double wantedSpacing) {
    return new RoadSampler(circuit, conditions).refined(wantedSpacing);
  }

  static Road blank(
      boolean closed, double length, double spacing, double[] distance, int[] pointOfStation) {
    return new Road(closed, length, spacing, distance, pointOfStation);
  }

  /** Returns the even stations alone. */
  public Road stationsOnly() {
    int stations = stations();
    double[] even = new double[stations];
    int[] same = new int[stations];
    for (int i = 0; i < stations; i++) {
      even[i] = distance[pointOfStation[i]];
      same[i] = i;
    }
    Road road = new Road(closed, length, spacing, even, same);
    for (int i = 0; i < stations; i++) {
      int k = pointOfStation[i];
      road.set(
          i,
          curvature[k],
          curvatureGradient[k],
          grade[k],
          bank[k],
          verticalCurvature[k],
          gripLeft[k],
          gripRight[k],
          headwind[k]);
    }
    return road;
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

  /** Returns the distance between even stations (m). */
  public double spacing() {
    return spacing;
  }

  /** Returns the number of points. */
  public int size() {
    return curvature.length;
  }

  /** Returns the number of even stations. */
  public int stations() {
    return pointOfStation.length;
  }

  /** Returns the point at an even station. */
  public int pointOf(int station) {
    return pointOfStation[station];
  }

  /** Returns the distance of a point from the start line (m). */
  public double distance(int i) {
    return distance[i];
  }

  /** Returns the distance from a point to the next one (m); on a closed road across the line. */
  public double step(int i) {
    return (i + 1 < distance.length ? distance[i + 1] : length) - distance[i];
  }

  /** Returns the next point; the last one of an open road is its own. */
  public int next(int i) {
    return i + 1 < distance.length ? i + 1 : closed ? 0 : i;
  }

  /** Returns the point before; the first one of an open road is its own. */
  public int previous(int i) {
    return i > 0 ? i - 1 : closed ? distance.length - 1 : 0;
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
