package rampwright.vehicle.circuit.survey;

import java.util.Arrays;

/** A growing row of numbers. */
final class Series {
  private double[] values = new double[256];
  private int size;

  void add(double value) {
    if (size == values.length) {
      values = Arrays.copyOf(values, 2 * size);
    }
    values[size++] = value;
  }

  double get(int i) {
    return values[i];
  }

  int size() {
    return size;
  }

  double[] toArray() {
    return Arrays.copyOf(values, size);
  }
}
