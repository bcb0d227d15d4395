package rampwright.vehicle.trim;

/**
 * Dense linear systems of a handful of unknowns, solved in place by Gaussian elimination with
 * partial pivoting. A workspace; one instance per thread.
 */
final class SmallSystem {
  private final int capacity;
  private final int columns;

  /** Matrix and right-hand sides, row by row: {@code a[row * columns + column]}. */
  final double[] a;

  /** Sign of the determinant of the last solved matrix; 0 when it was singular. */
  int determinantSign;

  SmallSystem(int capacity, int rightHandSides) {
    this.capacity = capacity;
    this.columns = capacity + rightHandSides;
    this.a = new double[capacity * columns];
  }

  /**
   * Returns the index of an entry; right-hand side {@code k} stands in column {@code capacity + k}.
   */
  int at(int row, int column) {
    return row * columns + column;
  }

  int rightHandSide(int row, int k) {
    return row * columns + capacity + k;
  }

  /**
   * Solves for the first {@code n} unknowns and {@code sides} right-hand sides, which are
   * overwritten by the solutions.
   *
   * @return false when the matrix is singular to working precision
   */
  boolean solve(int n, int sides) {
    int sign = 1;
    for (int k = 0; k < n; k++) {
      int pivot = k;
      double largest = Math.abs(a[k * columns + k]);
      for (int i = k + 1; i < n; i++) {
        double candidate = Math.abs(a[i * columns + k]);
        if (candidate > largest) {
          largest = candidate;
          pivot = i;
        }
      }
      if (!(largest > 1e-300)) {
        determinantSign = 0;
        return false;
      }
      if (pivot != k) {
        swap(pivot, k, n, sides);
        sign = -sign;
      }
      double diagonal = a[k * columns + k];
      if (diagonal < 0) {
        sign = -sign;
      }
      for (int i = k + 1; i < n; i++) {
        double factor = a[i * columns + k] / diagonal;
        if (factor != 0) {
          eliminate(i, k, factor, n, sides);
        }
      }
    }
    determinantSign = sign;
    for (int side = 0; side < sides; side++) {
      substitute(n, side);
    }
    return true;
  }

  private void swap(int i, int k, int n, int sides) {
    for (int j = k; j < n; j++) {
      double keep = a[i * columns + j];
      a[i * columns + j] = a[k * columns + j];
      a[k * columns + j] = keep;
    }
    for (int j = capacity; j < capacity + sides; j++) {
      double keep = a[i * columns + j];
      a[i * columns + j] = a[k * columns + j];
      a[k * columns + j] = keep;
    }
  }

  private void eliminate(int i, int k, double factor, int n, int sides) {
    for (int j = k + 1; j < n; j++) {
      a[i * columns + j] -= factor * a[k * columns + j];
    }
    for (int j = capacity; j < capacity + sides; j++) {
      a[i * columns + j] -= factor * a[k * columns + j];
    }
  }

  private void substitute(int n, int side) {
    for (int i = n - 1; i >= 0; i--) {
      double sum = a[i * columns + capacity + side];
      for (int j = i + 1; j < n; j++) {
        sum -= a[i * columns + j] * a[j * columns + capacity + side];
      }
      a[i * columns + capacity + side] = sum / a[i * columns + i];
    }
  }
}
