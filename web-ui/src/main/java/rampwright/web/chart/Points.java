package rampwright.web.chart;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Turns arrays of the model into points for the browser. */
final class Points {
  /** Enough for a screen, and a third of the length of a full double. */
  private static final MathContext DIGITS = new MathContext(6);

  private Points() {}

  static List<List<Double>> of(double[] x, double[] y) {
    if (x.length != y.length) {
      throw new IllegalArgumentException(x.length + " places for " + y.length + " values");
    }
    List<List<Double>> points = new ArrayList<>(x.length);
    for (int i = 0; i < x.length; i++) {
      points.add(Arrays.asList(rounded(x[i]), rounded(y[i])));
    }
    return points;
  }

  /** Returns the value in six digits, null for one that is not finite: JSON knows no NaN. */
  static Double rounded(double value) {
    return Double.isFinite(value) ? new BigDecimal(value).round(DIGITS).doubleValue() : null;
  }
}
