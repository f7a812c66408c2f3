package loopwright.laws;

/**
 * A dense real matrix of numbers that are sums of two doubles, about 32 digits (Dekker, Numerische
 * Mathematik 18, 1971, 224–242), with an elimination by partial pivoting.
 */
final class DoubleDouble {
  private final int rows;
  private final int columns;
  private final double[] high;
  private final double[] low;

  /** Product or quotient of the last operation. */
  private double resultHigh;

  private double resultLow;

  /** A matrix of zeros. */
  DoubleDouble(int rows, int columns) {
    this.rows = rows;
    this.columns = columns;
    this.high = new double[rows * columns];
    this.low = new double[rows * columns];
  }

  /** Adds to an entry. */
  void add(int row, int column, double value) {
    accumulate(row * columns + column, value, 0);
  }

  /** An entry, rounded. */
  double get(int row, int column) {
    return high[row * columns + column];
  }

  /** Largest sum of the magnitudes of a row, over the given columns. */
  double norm(int from, int to) {
    double norm = 0;
    for (int row = 0; row < rows; row++) {
      double sum = 0;
      for (int column = from; column < to; column++) {
        sum += Math.abs(get(row, column));
      }
      norm = Math.max(norm, sum);
    }
    return norm;
  }

  /**
   * Turns the square matrix on the left into the unit matrix by row operations, the columns right
   * of it into its inverse times them (Gauss and Jordan).
   */
  void reduce() {
    for (int k = 0; k < rows; k++) {
      int pivot = k;
      for (int row = k + 1; row < rows; row++) {
        pivot = Math.abs(get(row, k)) > Math.abs(get(pivot, k)) ? row : pivot;
      }
      swap(k, pivot);
      int diagonal = k * columns + k;
      double pivotHigh = high[diagonal];
      double pivotLow = low[diagonal];
      for (int column = k; column < columns; column++) {
        int at = k * columns + column;
        if (high[at] != 0) {
          divide(high[at], low[at], pivotHigh, pivotLow);
          high[at] = resultHigh;
          low[at] = resultLow;
        }
      }
      for (int row = 0; row < rows; row++) {
        if (row != k && get(row, k) != 0) {
          subtract(row, k);
        }
      }
    }
  }

  /** Takes from a row as much of the pivot's row as makes its entry under the pivot zero. */
  private void subtract(int row, int pivotRow) {
    double factorHigh = -high[row * columns + pivotRow];
    double factorLow = -low[row * columns + pivotRow];
    for (int column = pivotRow; column < columns; column++) {
      int from = pivotRow * columns + column;
      if (high[from] != 0) {
        multiply(factorHigh, factorLow, high[from], low[from]);
        accumulate(row * columns + column, resultHigh, resultLow);
      }
    }
  }

  private void swap(int one, int other) {
    for (int column = 0; column < columns; column++) {
      int a = one * columns + column;
      int b = other * columns + column;
      double keptHigh = high[a];
      double keptLow = low[a];
      high[a] = high[b];
      low[a] = low[b];
      high[b] = keptHigh;
      low[b] = keptLow;
    }
  }

  private void accumulate(int at, double addHigh, double addLow) {
    double sum = high[at] + addHigh;
    double part = sum - high[at];
    double rest = (high[at] - (sum - part)) + (addHigh - part) + low[at] + addLow;
    high[at] = sum + rest;
    low[at] = rest - (high[at] - sum);
  }

  private void multiply(double aHigh, double aLow, double bHigh, double bLow) {
    double product = aHigh * bHigh;
    double rest = Math.fma(aHigh, bHigh, -product) + aHigh * bLow + aLow * bHigh;
    resultHigh = product + rest;
    resultLow = rest - (resultHigh - product);
  }

  private void divide(double aHigh, double aLow, double bHigh, double bLow) {
    double quotient = aHigh / bHigh;
    double rest = (Math.fma(-quotient, bHigh, aHigh) + aLow - quotient * bLow) / bHigh;
    resultHigh = quotient + rest;
    resultLow = rest - (resultHigh - quotient);
  }
}
