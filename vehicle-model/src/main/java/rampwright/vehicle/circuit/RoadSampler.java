package rampwright.vehicle.circuit;

import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.analysis.interpolation.AkimaSplineInterpolator;
import org.apache.commons.math3.analysis.polynomials.PolynomialSplineFunction;
import rampwright.vehicle.Conditions;

/**
 * Samples a circuit at even spacing with Akima splines: slope continuous, and no overshoot at the
 * end of a straight, which a natural cubic spline would have.
 */
final class RoadSampler {
  /** Stations repeated beyond each end of a closed circuit, so that the spline joins smoothly. */
  private static final int WRAP = 4;

  private RoadSampler() {}

  static Road sample(Circuit circuit, Conditions conditions, double wantedSpacing) {
    int intervals = Math.max(4, (int) Math.round(circuit.length() / wantedSpacing));
    int size = circuit.closed() ? intervals : intervals + 1;
    Road road = Road.blank(circuit.closed(), circuit.length(), size);
    PolynomialSplineFunction curvature = spline(circuit, Station::curvature);
    PolynomialSplineFunction curvatureGradient = curvature.polynomialSplineDerivative();
    PolynomialSplineFunction grade = spline(circuit, Station::grade);
    PolynomialSplineFunction gradeGradient = grade.polynomialSplineDerivative();
    PolynomialSplineFunction bank = spline(circuit, Station::bank);
    PolynomialSplineFunction left = spline(circuit, Station::gripLeft);
    PolynomialSplineFunction right = spline(circuit, Station::gripRight);
    Heading heading = new Heading(circuit, curvature);
    for (int i = 0; i < size; i++) {
      double s = Math.min(i * road.spacing(), circuit.length());
      double headwind =
          conditions.windSpeed() == 0
              ? 0
              : conditions.windSpeed() * Math.cos(conditions.windFrom() - heading.next(s));
      road.set(
          i,
          curvature.value(s),
          curvatureGradient.value(s),
          grade.value(s),
          bank.value(s),
          gradeGradient.value(s),
          left.value(s),
          right.value(s),
          headwind);
    }
    return road;
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
