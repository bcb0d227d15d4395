package rampwright.vehicle.circuit.survey;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;

/** Points of a curve, as two columns that do not change. */
public final class Curve {
  private final double[] x;
  private final double[] y;

  private Curve(double[] x, double[] y) {
    this.x = x;
    this.y = y;
  }

  /**
   * Returns the curve through points.
   *
   * @throws IllegalArgumentException when the columns differ in length
   */
  public static Curve of(double[] x, double[] y) {
    if (x.length != y.length) {
      throw new IllegalArgumentException(x.length + " and " + y.length + " values");
    }
    return new Curve(x.clone(), y.clone());
  }

  /** Returns a curve with a value for each of {@code size} places {@code i * step}. */
  static Curve even(int size, double step, DoubleUnaryOperator value) {
    double[] x = new double[size];
    double[] y = new double[size];
    for (int i = 0; i < size; i++) {
      x[i] = i * step;
      y[i] = value.applyAsDouble(x[i]);
    }
    return new Curve(x, y);
  }

  /** Returns the number of points. */
  public int size() {
    return x.length;
  }

  /** Returns the first value of a point. */
  public double x(int i) {
    return x[i];
  }

  /** Returns the second value of a point. */
  public double y(int i) {
    return y[i];
  }

  /**
   * Returns the second value at a first value, on the straight line between its neighbours; beyond
   * the ends the last straight line goes on. First values must rise.
   */
  double at(double place) {
    int found = Arrays.binarySearch(x, place);
    if (found >= 0) {
      return y[found];
    }
    int after = Math.max(1, Math.min(x.length - 1, -found - 1));
    double share = (place - x[after - 1]) / (x[after] - x[after - 1]);
    return y[after - 1] + share * (y[after] - y[after - 1]);
  }

  /** Returns the curve with its values multiplied. */
  Curve scaled(double factorX, double factorY) {
    return new Curve(times(x, factorX), times(y, factorY));
  }

  private static double[] times(double[] values, double factor) {
    return Arrays.stream(values).map(value -> value * factor).toArray();
  }

  /** As {@link #at}, but beyond the ends the end value holds. */
  double within(double place) {
    return at(Math.max(x[0], Math.min(x[x.length - 1], place)));
  }
}
