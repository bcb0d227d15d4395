package rampwright.vehicle.circuit;

import java.util.Arrays;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.analysis.interpolation.AkimaSplineInterpolator;
import org.apache.commons.math3.analysis.polynomials.PolynomialSplineFunction;
import rampwright.vehicle.Conditions;

/**
 * Samples a circuit with Akima splines: slope continuous, and no overshoot at the end of a
 * straight, which a natural cubic spline would have.
 */
final class RoadSampler {
  /** Stations repeated beyond each end of a closed circuit, so that the spline joins smoothly. */
  private static final int WRAP = 4;

  /** Largest distance between points over the radius of the corner they lie in or near. */
  private static final double RESOLUTION = 0.04;

  /** Distance (m) before and behind a corner within which it counts as near. */
  private static final double NEAR = 12;

  /**
   * Curvature (1/m) that no survey can tell from a straight. Without it the rounding of a file
   * would decide which of two wheels at the peak of their tyres locks first.
   */
  private static final double STRAIGHT = 1e-5;

  /** The same for the change of curvature along the path (1/m²). */
  private static final double STRAIGHT_GRADIENT = 1e-6;

  private static final int MOST_POINTS = 8;

  private final Circuit circuit;
  private final Conditions conditions;
  private final PolynomialSplineFunction curvature;

  RoadSampler(Circuit circuit, Conditions conditions) {
    this.circuit = circuit;
    this.conditions = conditions;
    this.curvature = spline(circuit, Station::curvature);
  }

  Road even(double wantedSpacing) {
    int[] pieces = new int[intervals(wantedSpacing)];
    Arrays.fill(pieces, 1);
    return sample(pieces);
  }

  Road refined(double wantedSpacing) {
    int n = intervals(wantedSpacing);
    double spacing = circuit.length() / n;
    int reach = (int) Math.ceil(NEAR / spacing);
    double[] bend = new double[n];
    for (int i = 0; i < n; i++) {
      bend[i] = Math.abs(curvature.value(i * spacing));
    }
    int[] pieces = new int[n];
    for (int i = 0; i < n; i++) {
      double tightest = 0;
      for (int k = i - reach; k <= i + reach + 1; k++) {
        int at = circuit.closed() ? Math.floorMod(k, n) : Math.max(0, Math.min(n - 1, k));
        tightest = Math.max(tightest, bend[at]);
      }
      int wanted = (int) Math.ceil(spacing * tightest / RESOLUTION);
      pieces[i] = Math.max(1, Math.min(MOST_POINTS, wanted));
    }
    return sample(pieces);
  }

  private int intervals(double wantedSpacing) {
    return Math.max(4, (int) Math.round(circuit.length() / wantedSpacing));
  }

  /** Samples with a number of points in each interval between even stations. */
  private Road sample(int[] pieces) {
    int intervals = pieces.length;
    double spacing = circuit.length() / intervals;
    int size = Arrays.stream(pieces).sum() + (circuit.closed() ? 0 : 1);
    double[] distance = new double[size];
    int[] pointOfStation = new int[circuit.closed() ? intervals : intervals + 1];
    int point = 0;
    for (int i = 0; i < intervals; i++) {
      pointOfStation[i] = point;
      for (int k = 0; k < pieces[i]; k++) {
        distance[point++] = (i + (double) k / pieces[i]) * spacing;
      }
    }
    if (!circuit.closed()) {
      pointOfStation[intervals] = point;
      distance[point] = circuit.length();
    }
    Road road = Road.blank(circuit.closed(), circuit.length(), spacing, distance, pointOfStation);
    fill(road);
    return road;
  }

  private void fill(Road road) {
    PolynomialSplineFunction curvatureGradient = curvature.polynomialSplineDerivative();
    PolynomialSplineFunction grade = spline(circuit, Station::grade);
    PolynomialSplineFunction gradeGradient = grade.polynomialSplineDerivative();
    PolynomialSplineFunction bank = spline(circuit, Station::bank);
    PolynomialSplineFunction left = spline(circuit, Station::gripLeft);
    PolynomialSplineFunction right = spline(circuit, Station::gripRight);
    Heading heading = new Heading(circuit, curvature);
    for (int i = 0; i < road.size(); i++) {
      double s = road.distance(i);
      double headwind =
          conditions.windSpeed() == 0
              ? 0
              : conditions.windSpeed() * Math.cos(conditions.windFrom() - heading.next(s));
      double bend = curvature.value(s);
      double gradient = curvatureGradient.value(s);
      boolean straight = Math.abs(bend) < STRAIGHT && Math.abs(gradient) < STRAIGHT_GRADIENT;
      road.set(
          i,
          straight ? 0 : bend,
          straight ? 0 : gradient,
          grade.value(s),
          bank.value(s),
          gradeGradient.value(s),
          left.value(s),
          right.value(s),
          headwind);
    }
  }

  private static PolynomialSplineFunction spline(Circuit circuit, ToDoubleFunction<Station> value) {
    int n = circuit.stations().size();
    int wrap = circuit.closed() ? Math.min(WRAP, n) : 0;
    double[] s = new double[n + 2 * wrap];
    double[] y = new double[n + 2 * wrap];
    for (int k = 0; k < s.length; k++) {
      int lap = Math.floorDiv(k - wrap, n);
      Station station = circuit.stations().get(Math.floorMod(k - wrap, n));
      s[k] = station.distance() + lap * circuit.length();
      y[k] = value.applyAsDouble(station);
    }
    return new AkimaSplineInterpolator().interpolate(s, y);
  }

  /** Direction of travel (rad) from the curvature, starting along the first two positions. */
  private static final class Heading {
    private final PolynomialSplineFunction curvature;
    private double s;
    private double angle;

    Heading(Circuit circuit, PolynomialSplineFunction curvature) {
      this.curvature = curvature;
      Station a = circuit.stations().get(0);
      Station b = circuit.stations().get(1);
      // the chord points along the path half way between the two stations
      this.angle =
          Math.atan2(b.y() - a.y(), b.x() - a.x())
              - 0.25 * (a.curvature() + b.curvature()) * (b.distance() - a.distance());
    }

    double next(double to) {
      angle += 0.5 * (curvature.value(s) + curvature.value(to)) * (to - s);
      s = to;
      return angle;
    }
  }
}
