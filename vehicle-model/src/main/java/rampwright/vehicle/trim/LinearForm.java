package rampwright.vehicle.trim;

import java.util.Arrays;

/** A fixed linear function of the results of {@link ForceBalance}; only its terms are stored. */
final class LinearForm {
  /** Terms are written out up to this number, because most forms have two. */
  private static final int WRITTEN_OUT = 2;

  private final int first;
  private final int second;
  private final double firstFactor;
  private final double secondFactor;
  private final int[] index;
  private final double[] factor;

  private LinearForm(int[] index, double[] factor) {
    this.first = index.length > 0 ? index[0] : 0;
    this.second = index.length > 1 ? index[1] : 0;
    this.firstFactor = index.length > 0 ? factor[0] : 0;
    this.secondFactor = index.length > 1 ? factor[1] : 0;
    this.index = index;
    this.factor = factor;
  }

  /** Returns the function with the given coefficients, one per result. */
  static LinearForm of(double[] coefficients) {
    int terms = 0;
    int[] index = new int[coefficients.length];
    for (int j = 0; j < coefficients.length; j++) {
      if (coefficients[j] != 0) {
        index[terms++] = j;
      }
    }
    double[] factor = new double[terms];
    for (int k = 0; k < terms; k++) {
      factor[k] = coefficients[index[k]];
    }
    return new LinearForm(Arrays.copyOf(index, terms), factor);
  }

  /** Returns the value for results or for their changes. */
  double apply(double[] values) {
    double sum = firstFactor * values[first] + secondFactor * values[second];
    for (int k = WRITTEN_OUT; k < index.length; k++) {
      sum += factor[k] * values[index[k]];
    }
    return sum;
  }
}
