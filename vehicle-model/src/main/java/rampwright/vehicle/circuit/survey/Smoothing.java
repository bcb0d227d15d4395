package rampwright.vehicle.circuit.survey;

/**
 * Zero-phase smoothing of evenly spaced values: a Gaussian of fourth order, {@code (3 - u²)/2 *
 * exp(-u²/2)}, which keeps cubic curves as they are and so flattens the peak of a corner far less
 * than a plain mean.
 *
 * <p>Its response to a wave is {@code (1 + q) * exp(-q)}, {@code q = (2*pi*sigma/wavelength)²/2}
 * (Fourier transform of the kernel). The smoothing length is the wavelength of response one half.
 */
final class Smoothing {
  /** Root of {@code (1 + q) exp(-q) = 1/2}. */
  private static final double HALF = 1.6783469900166605;

  /** Standard deviation over smoothing length. */
  static final double SIGMA = Math.sqrt(2 * HALF) / (2 * Math.PI);

  /** Half width of the kernel in standard deviations; what lies beyond is below a millionth. */
  private static final double REACH = 6;

  private Smoothing() {}

  /**
   * Smooths values.
   *
   * @param closed whether the last value is followed by the first; an open row is continued at its
   *     ends by its point reflection, so that a straight line stays one
   * @param spacing distance between values (m)
   * @param length smoothing length (m), 0 for none
   */
  static double[] smooth(double[] values, boolean closed, double spacing, double length) {
    int reach = (int) Math.min(REACH * SIGMA * length / spacing, values.length - 1);
    if (reach == 0) {
      return values.clone();
    }
    double[] kernel = kernel(reach, spacing / (SIGMA * length));
    double[] smooth = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      double sum = kernel[0] * values[i];
      for (int k = 1; k <= reach; k++) {
        sum += kernel[k] * (at(values, i - k, closed) + at(values, i + k, closed));
      }
      smooth[i] = sum;
    }
    return smooth;
  }

  private static double[] kernel(int reach, double step) {
    double[] kernel = new double[reach + 1];
    double sum = 0;
    for (int k = 0; k <= reach; k++) {
      double u2 = k * step * k * step;
      kernel[k] = (3 - u2) * Math.exp(-u2 / 2);
      sum += k == 0 ? kernel[k] : 2 * kernel[k];
    }
    for (int k = 0; k <= reach; k++) {
      kernel[k] /= sum;
    }
    return kernel;
  }

  private static double at(double[] values, int i, boolean closed) {
    int last = values.length - 1;
    if (closed) {
      return values[Math.floorMod(i, values.length)];
    }
    if (i < 0) {
      return 2 * values[0] - values[-i];
    }
    return i > last ? 2 * values[last] - values[2 * last - i] : values[i];
  }
}
