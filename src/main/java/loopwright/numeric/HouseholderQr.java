package loopwright.numeric;

/**
 * Factors A = Q R of a tall matrix by Householder reflections (Golub and Van Loan, Matrix
 * Computations, 5.2), without forming Q.
 */
final class HouseholderQr {
  private final double[][] a;
  private final double[] scale;
  private final int rows;
  private final int columns;

  /**
   * Factors.
   *
   * @param matrix rows by columns, at least as many rows as columns; not modified
   */
  HouseholderQr(double[][] matrix) {
    rows = matrix.length;
    columns = matrix[0].length;
    a = new double[rows][];
    for (int i = 0; i < rows; i++) {
      a[i] = matrix[i].clone();
    }
    scale = new double[columns];
    for (int k = 0; k < columns; k++) {
      reflect(k);
    }
  }

  private void reflect(int k) {
    double norm = 0;
    for (int i = k; i < rows; i++) {
      norm = Math.hypot(norm, a[i][k]);
    }
    if (norm == 0) {
      return;
    }
    double diagonal = a[k][k] > 0 ? -norm : norm;
    // The vector of the reflection stays below the diagonal, its head is 1 after scaling.
    double head = a[k][k] - diagonal;
    for (int i = k + 1; i < rows; i++) {
      a[i][k] /= head;
    }
    scale[k] = -head / diagonal;
    a[k][k] = diagonal;
    for (int j = k + 1; j < columns; j++) {
      double sum = a[k][j];
      for (int i = k + 1; i < rows; i++) {
        sum += a[i][k] * a[i][j];
      }
      sum *= scale[k];
      a[k][j] -= sum;
      for (int i = k + 1; i < rows; i++) {
        a[i][j] -= sum * a[i][k];
      }
    }
  }

  /** Row i, column j of R. */
  double r(int i, int j) {
    return j < i ? 0 : a[i][j];
  }

  /** The vector Qᵀ b; not modified is b. */
  double[] transposedQ(double[] b) {
    double[] y = b.clone();
    for (int k = 0; k < columns; k++) {
      double sum = y[k];
      for (int i = k + 1; i < rows; i++) {
        sum += a[i][k] * y[i];
      }
      sum *= scale[k];
      y[k] -= sum;
      for (int i = k + 1; i < rows; i++) {
        y[i] -= sum * a[i][k];
      }
    }
    return y;
  }

  /** The x that makes |A x − b| least; entries are not finite where R is singular. */
  double[] solve(double[] b) {
    double[] y = transposedQ(b);
    double[] x = new double[columns];
    for (int i = columns - 1; i >= 0; i--) {
      double sum = y[i];
      for (int j = i + 1; j < columns; j++) {
        sum -= a[i][j] * x[j];
      }
      x[i] = sum / a[i][i];
    }
    return x;
  }

  /** The inverse of Aᵀ A = Rᵀ R; entries are not finite where R is singular. */
  double[][] inverseOfSquare() {
    double[][] inverse = new double[columns][columns];
    for (int j = 0; j < columns; j++) {
      for (int i = j; i >= 0; i--) {
        double sum = i == j ? 1 : 0;
        for (int k = i + 1; k <= j; k++) {
          sum -= a[i][k] * inverse[k][j];
        }
        inverse[i][j] = sum / a[i][i];
      }
    }
    double[][] product = new double[columns][columns];
    for (int i = 0; i < columns; i++) {
      for (int j = 0; j < columns; j++) {
        for (int k = Math.max(i, j); k < columns; k++) {
          product[i][j] += inverse[i][k] * inverse[j][k];
        }
      }
    }
    return product;
  }
}
