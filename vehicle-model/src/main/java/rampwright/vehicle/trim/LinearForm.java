package rampwright.vehicle.trim;

import java.util.Arrays;

/** A fixed linear function of the results of {@link ForceBalance}; only its terms are stored. */
final class LinearForm {
  private final int[] index;
  private final double[] factor;

  private LinearForm(int[] index, double[] factor) {
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
    double sum = 0;
    for (int k = 0; k < index.length; k++) {
      sum += factor[k] * values[index[k]];
    }
    return sum;
  }
}
